import type { ShockSizeRow } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { formatSize } from '../../lib/format-figure';
import { formatMoney } from '../../lib/format-money';
import { SizeBar, SizeScale } from './size-bar';
import { SizeLinkRow } from './size-link-row';

const columns = {
  base: 'minmax(0, 1fr) auto',
  md: '8.5rem minmax(0, 1fr) 6rem 7rem',
};

const families = {
  eyelet: 'Eyelet sizes',
  trunnion: 'Trunnion sizes',
  inch: 'Sizes from inches',
} as const;

export const shocksInWords = (count: number): string => (count === 1 ? '1 shock' : `${count} shocks`);

export interface SizeRowsProps {
  sizes: readonly ShockSizeRow[];
  /** Of the address, handed on so that the narrowing stays. */
  search: string;
}

/** Sizes as rows on one millimetre scale, in the three families that never mix. */
export function SizeRows({ sizes, search }: SizeRowsProps) {
  return (['eyelet', 'trunnion', 'inch'] as const).map((family) => {
    const rows = sizes.filter((size) => size.family === family);
    return rows.length === 0 ? null : <Family key={family} family={family} rows={rows} search={search} />;
  });
}

function Family({
  family,
  rows,
  search,
}: {
  family: keyof typeof families;
  rows: readonly ShockSizeRow[];
  search: string;
}) {
  return (
    <chakra.section aria-label={families[family]} marginBottom="10">
      <chakra.div
        display="grid"
        gridTemplateColumns={columns}
        columnGap="6"
        alignItems="end"
        borderTopWidth="2px"
        borderColor="ink"
        paddingTop="3"
        paddingBottom="1"
        color="slate"
        fontSize="sm"
        lineHeight="heading"
      >
        <chakra.h2 gridColumn={{ base: '1 / -1', md: 'auto' }} color="ink" fontSize="md" fontWeight="heavy">
          {families[family]}
        </chakra.h2>
        <chakra.div gridColumn={{ base: '1 / -1', md: 'auto' }}>
          <SizeScale />
        </chakra.div>
        <chakra.span display={{ base: 'none', md: 'block' }} textAlign="right" aria-hidden="true">
          On offer
        </chakra.span>
        <chakra.span display={{ base: 'none', md: 'block' }} textAlign="right" aria-hidden="true">
          From, with VAT
        </chakra.span>
      </chakra.div>
      <chakra.ul listStyleType="none" borderBottomWidth="1px" borderColor="hair">
        {rows.map((row) => (
          <li key={row.sizeKey}>
            <SizeRow row={row} search={search} />
          </li>
        ))}
      </chakra.ul>
    </chakra.section>
  );
}

function SizeRow({ row, search }: { row: ShockSizeRow; search: string }) {
  const { sizeKey, inches, family, eyeToEyeMm, strokeMm, shocks, fromMinor } = row;
  const [nominal, stroke] = sizeKey.split('x').map(Number);
  return (
    <SizeLinkRow gridTemplateColumns={columns} to={`/shocks/sizes/${sizeKey}${search}`}>
      <span>
        <chakra.b fontSize="lg" fontWeight="heavy" textUnderlineOffset="0.2em" textDecorationThickness="1px">
          {formatSize(nominal ?? eyeToEyeMm, stroke ?? strokeMm)}
        </chakra.b>{' '}
        <chakra.span fontSize="sm" color="slate">
          mm
        </chakra.span>
        {inches ? (
          <chakra.span display="block" fontSize="sm" color="slate">
            {inches} in
          </chakra.span>
        ) : null}
      </span>
      <chakra.div order={{ base: 1, md: 0 }} gridColumn={{ base: '1 / -1', md: 'auto' }}>
        <SizeBar eyeToEyeMm={eyeToEyeMm} strokeMm={strokeMm} trunnion={family === 'trunnion'} />
      </chakra.div>
      <chakra.span display={{ base: 'none', md: 'block' }} textAlign="right" whiteSpace="nowrap">
        {shocksInWords(shocks)}
      </chakra.span>
      <chakra.span textAlign="right" whiteSpace="nowrap">
        {fromMinor === null ? (
          <chakra.span color="slate">none free</chakra.span>
        ) : (
          <>
            <chakra.span color="slate" fontSize="sm" display={{ md: 'none' }}>
              {shocksInWords(shocks)} from{' '}
            </chakra.span>
            <chakra.span fontWeight="bold">{formatMoney(fromMinor)}</chakra.span>
          </>
        )}
      </chakra.span>
    </SizeLinkRow>
  );
}
