import type { Advice, AskNeed, CheckAnswer, WorkNeed } from '../answers.js';
import type { Source } from '../facts.js';
import { sizes } from '../sizing/sizes.js';
import type { SizeResult } from '../sizing/resolve-size.js';
import { figureText } from './figure-text.js';
import { labels } from './labels.en.js';
import { sentences } from './sentences.en.js';

export { figureText };

export interface Told {
  /** One plain sentence. */
  short: string;
  figures: { label: string; text: string; source: Source }[];
}

/** An answer or a piece of advice in one sentence and in full. */
export function tell(said: CheckAnswer | Advice): Told {
  const texts = new Map<string, string>();
  for (const figure of said.figures) {
    if (!texts.has(figure.key)) texts.set(figure.key, figureText(figure));
  }
  const pattern: string = sentences[said.code as keyof typeof sentences] ?? said.code;
  return {
    short: pattern.replace(/\{([^}]+)\}/g, (_, key: string) => texts.get(key) ?? 'a figure we do not have'),
    figures: said.figures.map((figure) => ({
      label: labels[figure.key] ?? figure.key,
      text: figureText(figure),
      source: figure.source,
    })),
  };
}

const workSentences: Record<WorkNeed['id'], string> = {
  'press-in-kit': 'Press in new mounting hardware',
  'press-in-reuse': 'Inspect the old mounting hardware and press it across',
  'travel-spacer': 'Fit a travel spacer inside the damper',
  'fit-coil': 'Fit the coil spring',
  'fit-remote': 'Fit the lever and connect it',
  'route-external': 'Run the cable outside the frame',
  'hold-open-part': 'Fit the part that holds the shock open',
  'fit-shock': 'Take the old shock out, fit the new one, set it up',
};

/** One line of work, with the end where there is one. */
export function tellWork({ id, end }: Pick<WorkNeed, 'id' | 'end'>): string {
  if (end === null) return `${workSentences[id]}.`;
  return end === 'frame' ? `${workSentences[id]}, frame end.` : `${workSentences[id]}, link end.`;
}

const askWords: Record<AskNeed['whom'], string> = {
  rider: 'You can answer this yourself.',
  'frame-maker': 'Ask the frame’s maker.',
  'shock-maker': 'Ask the shock’s maker.',
  workshop: 'Ask a partner workshop.',
};
export const tellAsk = ({ whom }: AskNeed): string => askWords[whom];

const nextWords: Record<NonNullable<SizeResult['measureNext']>, string> = {
  'eye-to-eye': 'Measure eye-to-eye with a caliper',
  'stroke-shaft': 'Measure the shaft’s travel',
  'stroke-compressed': 'Measure eye-to-eye with all air out and the shock pushed together',
};

/** What the resolver makes of the readings so far, for a rider. */
export function tellSize(size: SizeResult): string {
  const next = size.measureNext ? nextWords[size.measureNext] : '';
  const [best, second] = size.candidates;
  switch (size.state) {
    case 'nothing-yet':
      return 'No reading yet.';
    case 'settled':
      return size.fromPrint
        ? `The print says ${size.sizeKey}, and nothing you measured speaks against it.`
        : `Settled: your shock is a ${size.sizeKey}.`;
    case 'no-such-size':
      return `No shock size has these figures. ${next} once more.`;
    case 'measure-again': {
      if (size.fromPrint)
        return `Your reading does not go with the printed ${best?.sizeKey}. ${next} once more.`;
      const lengths = new Set(size.candidates.map(({ sizeKey }) => sizeKey.split('x')[0]));
      const [length] = lengths;
      if (lengths.size === 1 && length) {
        const strokes = sizes
          .filter(({ key }) => key.startsWith(`${length}x`))
          .map(({ key }) => key.split('x')[1]);
        return `Reads as a ${length} shock. With a stroke near ${listed(strokes)} we can be sure of the size. ${next}.`;
      }
      return `Either ${best?.sizeKey} or ${second?.sizeKey}. ${next} to tell them apart.`;
    }
  }
}

const listed = (words: readonly (string | undefined)[]): string =>
  words.length < 2 ? String(words[0]) : `${words.slice(0, -1).join(', ')} or ${words.at(-1)}`;
