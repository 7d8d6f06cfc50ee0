import type { ShockPage } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { formatSize } from '../../lib/format-figure';
import { formatMoney } from '../../lib/format-money';
import { SizeBar, SizeScale } from './size-bar';
import { SizeLinkRow } from './size-link-row';

const columns = { base: 'minmax(0, 1fr) auto', md: '8.5rem minmax(0, 1fr) 8rem' };
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
              <SizeLinkRow gridTemplateColumns={columns} to={`/shocks/${sizeId}`}>
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
              </SizeLinkRow>
            </li>
          );
        })}
      </chakra.ul>
    </>
  );
}
