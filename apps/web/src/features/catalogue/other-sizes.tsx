import type { ShockPage } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { formatSize } from '../../lib/format-figure';
import { formatMoney } from '../../lib/format-money';
import { SizeBar, SizeScale } from './size-bar';

const columns = { base: 'minmax(0, 1fr) auto', md: '8.5rem minmax(0, 1fr) 8rem' };
const Row = chakra(Link, {
  base: {
    display: 'grid',
    gridTemplateColumns: columns,
    columnGap: '6',
    rowGap: '1',
    alignItems: 'center',
    minHeight: 'target',
    paddingBlock: '2',
    borderTopWidth: '1px',
    borderColor: 'hair',
    color: 'ink',
    fontVariantNumeric: 'tabular-nums',
    lineHeight: 'heading',
    '& b': { textDecorationLine: 'underline', textDecorationColor: 'var(--lf-colors-rule)' },
    _hover: { bg: 'wash', '& b': { textDecorationColor: 'var(--lf-colors-bracken)' } },
  },
});

/** The same model in its other sizes, on the scale of all sizes. */
export function OtherSizes({ page }: { page: ShockPage }) {
  const trunnion = page.drawing.bodyEnd.kind === 'trunnion';
  return (
    <>
      <chakra.div display="grid" gridTemplateColumns={columns} columnGap="6">
        <chakra.div gridColumn={{ base: '1 / -1', md: '2' }}>
          <SizeScale />
        </chakra.div>
      </chakra.div>
      <chakra.ul listStyleType="none" borderBottomWidth="1px" borderColor="hair">
        {page.otherSizes.map(({ sizeId, sizeKey, eyeToEyeMm, strokeMm, fromMinor }) => {
          const [eyeToEye, stroke] = sizeKey.split('x').map(Number);
          return (
            <li key={sizeId}>
              <Row to={`/shocks/${sizeId}`}>
                <span>
                  <chakra.b fontWeight="heavy" textUnderlineOffset="0.2em" textDecorationThickness="1px">
                    {formatSize(eyeToEye ?? eyeToEyeMm, stroke ?? strokeMm)}
                  </chakra.b>{' '}
                  <chakra.span fontSize="sm" color="slate">
                    mm
                  </chakra.span>
                </span>
                <chakra.div order={{ base: 1, md: 0 }} gridColumn={{ base: '1 / -1', md: 'auto' }}>
                  <SizeBar eyeToEyeMm={eyeToEyeMm} strokeMm={strokeMm} trunnion={trunnion} />
                </chakra.div>
                <chakra.span textAlign="right" whiteSpace="nowrap">
                  {fromMinor === null ? (
                    <chakra.span color="slate">no shop has it</chakra.span>
                  ) : (
                    <>
                      <chakra.span fontSize="sm" color="slate">
                        from{' '}
                      </chakra.span>
                      <chakra.span fontWeight="bold">{formatMoney(fromMinor)}</chakra.span>
                    </>
                  )}
                </chakra.span>
              </Row>
            </li>
          );
        })}
      </chakra.ul>
    </>
  );
}
