import { chakra } from '@chakra-ui/react';
import { Notice } from './notice';

/** Briefly, wherever somebody is about to buy or to work. */
export function Cautions({ lines }: { lines: readonly string[] }) {
  return (
    <Notice tone="gorse" title="Please read">
      <chakra.ul paddingLeft="5" listStyleType="disc">
        {lines.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </chakra.ul>
    </Notice>
  );
}
