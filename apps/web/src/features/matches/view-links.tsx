import type { MatchRow } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { TextLink } from '../../components/text-link';

const target = { display: 'inline-flex', alignItems: 'center', minHeight: 'target' } as const;

/** What can be drawn of this shock in this frame; nothing where it does not go in. */
export function ViewLinks({ row }: { row: MatchRow }) {
  if (row.verdict === 'wont-fit') return null;
  const name = `${row.makerName} ${row.modelName}`;
  return (
    <chakra.span display="flex" flexWrap="wrap" columnGap="4" fontSize="sm">
      <TextLink to={`${row.sizeId}/curves`} aria-label={`Curves of the ${name}`} {...target}>
        Curves
      </TextLink>
      {row.drawing.reservoir ? (
        <TextLink to={`${row.sizeId}/clearance`} aria-label={`Room for the ${name}`} {...target}>
          Room
        </TextLink>
      ) : null}
    </chakra.span>
  );
}
