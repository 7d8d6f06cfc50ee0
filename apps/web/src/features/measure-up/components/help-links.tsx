import type { QuestionKey } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { TextLink } from '../../../components/text-link';
import { VisuallyHidden } from '../../../components/visually-hidden';
import { topicOf, type TopicPath } from '../../help/topics';

/** The words of a question that have a page of their own. */
export const helpFor: Partial<Record<QuestionKey, readonly TopicPath[]>> = {
  'frame-travel': ['/help/stroke-is-not-travel'],
  'frame-end': ['/help/hardware', '/help/trunnion'],
  'link-end': ['/help/hardware', '/help/trunnion'],
  'reservoir-room': ['/help/reservoir'],
  'cable-routing': ['/help/remote'],
  'printed-size': ['/help/eye-to-eye'],
  'eye-to-eye': ['/help/eye-to-eye'],
  stroke: ['/help/stroke-is-not-travel'],
  mounts: ['/help/trunnion'],
  hardware: ['/help/hardware'],
  'present-spring': ['/help/air-or-coil'],
  'present-remote': ['/help/remote'],
  'spring-wish': ['/help/air-or-coil'],
  style: ['/help/stroke-is-not-travel'],
  'remote-wish': ['/help/remote'],
  'reservoir-wish': ['/help/reservoir'],
};

/** "What is eye-to-eye?": in a tab of its own, so that what is typed but not yet sent stays where it is. */
export function HelpLinks({ questionKey }: { questionKey: QuestionKey }) {
  const paths = helpFor[questionKey] ?? [];
  if (paths.length === 0) return null;
  return (
    <chakra.p display="flex" flexWrap="wrap" columnGap="6" marginBottom="2">
      {paths.map((path) => (
        <TextLink
          key={path}
          to={path}
          target="_blank"
          rel="noopener"
          display="inline-flex"
          alignItems="center"
          minHeight="target"
        >
          <span>
            {topicOf(path).title} <VisuallyHidden>(opens in a new tab)</VisuallyHidden>
          </span>
        </TextLink>
      ))}
    </chakra.p>
  );
}
