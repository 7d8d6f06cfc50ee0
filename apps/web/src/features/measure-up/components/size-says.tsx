import type { MeasureUpView, QuestionKey } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { Notice } from '../../../components/notice';

const about: readonly QuestionKey[] = ['printed-size', 'eye-to-eye', 'stroke', 'mounts'];

/** What the readings so far say about the size, and where they contradict the sheet. */
export function SizeSays({ view, questionKey }: { view: MeasureUpView; questionKey: QuestionKey }) {
  const { size } = view;
  const conflicts = size.conflicts.filter(({ question }) => question === questionKey);
  if (!about.includes(questionKey) || (size.state === 'nothing-yet' && conflicts.length === 0)) return null;
  return (
    <chakra.div display="grid" gap="3" marginBottom="4">
      {size.state === 'nothing-yet' ? null : (
        <Notice announce="status">
          <p>{size.say}</p>
        </Notice>
      )}
      {conflicts.map(({ say }) => (
        <Notice key={say} tone="heather" title="This does not agree with the sheet">
          <p>{say}</p>
        </Notice>
      ))}
    </chakra.div>
  );
}
