import type { Judgement } from './answers.js';
import type { FitQuestion } from './facts.js';

/** What would fit instead of a refused shock, the smallest change for each reason of refusal. */
export function whatWouldFit({ frame, shock }: FitQuestion, judgement: Judgement): string[] {
  const said = new Set<string>();
  const listed = [...new Set(frame.entries.flatMap((entry) => entry.sizeKey ?? []))];
  for (const { check, answer: kind, code } of judgement.answers) {
    if (kind !== 'fail') continue;
    switch (check) {
      case 'eye-to-eye':
      case 'stroke':
        if (listed.length > 0) said.add(`A shock of size ${listed.join(' or ')}.`);
        break;
      case 'mounts':
        said.add('The same size with the mounts that the frame asks for.');
        break;
      case 'spring-type':
        said.add(
          code === 'spring-type-air-only' ? 'An air shock of this size.' : 'A coil shock of this size.',
        );
        break;
      case 'coil-on-yoke':
        said.add('An air shock of this size.');
        break;
      case 'reservoir':
        said.add('An inline shock of this size.');
        break;
      case 'diameter':
        said.add('A shock with a narrower body.');
        break;
      case 'spring-rate':
      case 'pressure':
        said.add(
          shock.spring.kind === 'coil'
            ? 'An air shock of this size.'
            : 'An air shock with other pressure limits, or a coil where the maker allows it.',
        );
        break;
      case 'remote':
        said.add(code === 'remote-wanted-has-none' ? 'A shock with a remote.' : 'A shock without a remote.');
        break;
      case 'e-bike':
        said.add('A shock that its maker allows on e-bikes.');
        break;
      case 'rider-weight':
        said.add('A shock with a higher weight limit.');
        break;
      case 'position':
        said.add('A shock that may go in the other way round.');
        break;
      case 'notices':
        said.add('Nothing until the maker’s notice has been dealt with.');
        break;
      case 'hardware':
      case 'reading-conflict':
        break;
    }
  }
  return [...said];
}
