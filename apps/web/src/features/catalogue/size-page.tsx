import type { ShockList } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { LinkButton } from '../../components/link-button';
import { LoadFailed } from '../../components/load-failed';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Skeleton } from '../../components/skeleton';
import { TextLink } from '../../components/text-link';
import { formatFigure, formatSize } from '../../lib/format-figure';
import { usePageTitle } from '../../lib/page-title';
import { shocksQuery, sizesQuery } from './api';
import { NarrowSentence } from './narrow-sentence';
import { NotChecked } from './not-checked';
import { ShockRows } from './shock-rows';
import { shocksInWords } from './size-rows';
import { useNarrowing } from './use-narrowing';

type Named = NonNullable<ShockList['size']>;

const familyWords = {
  eyelet: 'A metric size for eyes at both ends.',
  trunnion: 'A metric size for a trunnion at the body end.',
  inch: 'A size that comes from inches.',
} as const;

const inWords = ({ sizeKey }: Pick<Named, 'sizeKey'>): string => {
  const [eyeToEye, stroke] = sizeKey.split('x').map(Number);
  return formatSize(eyeToEye ?? 0, stroke ?? null);
};

const lead = ({ family, inches, eyeToEyeMm, strokeMm }: Named): string =>
  `${familyWords[family]} Eye-to-eye ${formatFigure(eyeToEyeMm, 1)} mm, stroke ${formatFigure(strokeMm, 1)} mm${inches ? `, printed ${inches} in inches` : ''}.`;

export const upToShocks = (
  <TextLink to="/shocks" display="inline-flex" alignItems="center" minHeight="target">
    Shocks by size
  </TextLink>
);

/** All shocks of one size, drawn to one scale. */
export function SizePage() {
  const { sizeKey = '' } = useParams();
  const [narrowing, narrow, kept] = useNarrowing();
  const { data, error } = useQuery(shocksQuery({ size: sizeKey, ...narrowing }));
  const size = data?.size ?? null;
  usePageTitle(size ? `Shocks of ${inWords(size)} mm` : 'Shocks of one size');
  if (error) return <LoadFailed error={error} what="this size" />;
  if (data && !size) return <NoSuchSize typed={sizeKey} />;
  return (
    <Page>
      <PageHeading above={upToShocks} lead={size ? lead(size) : undefined}>
        {size ? `${inWords(size)} mm` : 'Shocks of one size'}
      </PageHeading>
      <NotChecked />
      <NarrowSentence narrowing={narrowing} onChange={narrow}>
        {data ? `${shocksInWords(data.total)} of this size.` : ''}
      </NarrowSentence>
      {!data || !size ? (
        <Skeleton lines={8} what="Loading shocks of this size" />
      ) : data.shocks.length === 0 ? (
        <Notice title="No shock of this size is like that">
          <p>Change the sentence above, or look at another size. There is no “close enough”.</p>
        </Notice>
      ) : (
        <ShockRows shocks={data.shocks} />
      )}
      {size ? <Neighbours size={size} search={kept} /> : null}
    </Page>
  );
}

function NoSuchSize({ typed }: { typed: string }) {
  return (
    <Page width="text">
      <PageHeading
        above={upToShocks}
        lead={`“${typed}” is no size that shocks are made in. There is no “close enough”: read it again, eye-to-eye first.`}
      >
        There is no such size
      </PageHeading>
      <LinkButton to="/shocks">Look at all sizes</LinkButton>
    </Page>
  );
}

/** Other strokes of the same length: so near that they are mixed up, and yet they do not fit instead. */
function Neighbours({ size, search }: { size: Named; search: string }) {
  const { data } = useQuery(sizesQuery({ spring: 'either', reservoir: 'either' }));
  const others = (data?.sizes ?? []).filter(
    (each) =>
      each.sizeKey !== size.sizeKey &&
      each.family === size.family &&
      Math.abs(each.eyeToEyeMm - size.eyeToEyeMm) < 5,
  );
  if (others.length === 0) return null;
  return (
    <chakra.nav aria-labelledby="other-strokes" marginTop="10">
      <chakra.h2 id="other-strokes" fontSize="lg" fontWeight="heavy">
        Easily mixed up with it
      </chakra.h2>
      <chakra.p color="slate" maxWidth="line">
        Nearly the same length. None of them fits in place of {inWords(size)}.
      </chakra.p>
      <chakra.ul listStyleType="none" display="flex" flexWrap="wrap" columnGap="6">
        {others.map((each) => (
          <li key={each.sizeKey}>
            <TextLink
              to={`/shocks/sizes/${each.sizeKey}${search}`}
              display="inline-flex"
              alignItems="center"
              minHeight="target"
              fontWeight="bold"
            >
              {inWords(each)} mm
            </TextLink>
          </li>
        ))}
      </chakra.ul>
    </chakra.nav>
  );
}
