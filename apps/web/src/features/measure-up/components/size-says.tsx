import type { MeasureUpView, QuestionKey } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useEffect, useState } from 'react';
import { Notice } from '../../../components/notice';
import { liveSize, type LiveSize } from '../specs/live-size';
import type { Raw } from '../specs/spec';

const about: readonly QuestionKey[] = ['printed-size', 'eye-to-eye', 'stroke', 'mounts'];
/** What is typed is read once the rider pauses: half a figure says nothing, and every word is read out. */
const pauseMs = 350;

function useLiveSize(view: MeasureUpView, questionKey: QuestionKey, raw: Raw): LiveSize | null {
  const [read, setRead] = useState(raw);
  useEffect(() => {
    const timer = setTimeout(() => setRead(raw), pauseMs);
    return () => clearTimeout(timer);
  }, [raw]);
  return questionKey === 'eye-to-eye' || questionKey === 'stroke' ? liveSize(view, questionKey, read) : null;
}

export interface SizeSaysProps {
  view: MeasureUpView;
  questionKey: QuestionKey;
  raw: Raw;
}

/** What the readings say about the size, that in hand among them, and where they contradict the sheet. */
export function SizeSays({ view, questionKey, raw }: SizeSaysProps) {
  const live = useLiveSize(view, questionKey, raw);
  if (!about.includes(questionKey)) return null;
  const { size } = view;
  const kept = size.state === 'nothing-yet' ? null : size.say;
  const say = live ? live.say : kept;
  const conflicts = live
    ? live.conflicts
    : size.conflicts.filter(({ question }) => question === questionKey).map((one) => one.say);
  return (
    <chakra.div display="grid" gap="3" marginBottom="4" role="status">
      {say === null ? null : (
        <Notice>
          <p>{say}</p>
        </Notice>
      )}
      {conflicts.map((line) => (
        <Notice key={line} tone="heather" title="This does not agree with the sheet">
          <p>{line}</p>
        </Notice>
      ))}
    </chakra.div>
  );
}
