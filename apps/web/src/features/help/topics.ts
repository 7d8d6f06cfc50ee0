export type TopicPath =
  | '/help/eye-to-eye'
  | '/help/stroke-is-not-travel'
  | '/help/trunnion'
  | '/help/hardware'
  | '/help/air-or-coil'
  | '/help/reservoir'
  | '/help/remote';

export interface Topic {
  path: TopicPath;
  title: string;
  /** The one thing to take away. */
  summary: string;
}

/** The help pages, in the order in which a measure-up meets their words. */
export const topics: readonly Topic[] = [
  {
    path: '/help/eye-to-eye',
    title: 'What is eye-to-eye?',
    summary: 'The length of a shock, from the centre of one mounting hole to the centre of the other.',
  },
  {
    path: '/help/stroke-is-not-travel',
    title: 'Stroke is not travel',
    summary: 'The shock shortens by its stroke; the wheel moves by its travel, two to three times as far.',
  },
  {
    path: '/help/trunnion',
    title: 'What is a trunnion?',
    summary: 'Two bolts of the frame go straight into the shock’s body, where others have an eye.',
  },
  {
    path: '/help/hardware',
    title: 'What is mounting hardware?',
    summary: 'Bush, spacers and pin that bring an eye to the width and the bolt of your frame.',
  },
  {
    path: '/help/air-or-coil',
    title: 'Air or coil?',
    summary: 'Two kinds of spring: one set with a pump, one chosen by its rate.',
  },
  {
    path: '/help/reservoir',
    title: 'What is a reservoir for?',
    summary: 'More damper oil, which stays cooler on long descents, if your frame has room for it.',
  },
  {
    path: '/help/remote',
    title: 'What does a remote do?',
    summary: 'A lever at the bar firms the shock. Lever and shock must agree on what a pull means.',
  },
];

export function topicOf(path: TopicPath): Topic {
  const topic = topics.find((each) => each.path === path);
  if (!topic) throw new Error(`No help page at ${path}`);
  return topic;
}
