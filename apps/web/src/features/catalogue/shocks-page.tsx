import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Skeleton } from '../../components/skeleton';
import { TextLink } from '../../components/text-link';
import { usePageTitle } from '../../lib/page-title';
import { shocksQuery, sizesQuery, type Narrowing } from './api';
import { FindForm } from './find-form';
import { NarrowSentence } from './narrow-sentence';
import { NotChecked } from './not-checked';
import { NotLoaded } from './not-loaded';
import { ShockRows } from './shock-rows';
import { shocksInWords, SizeRows } from './size-rows';
import { useNarrowing } from './use-narrowing';

/** The storefront: every size on one scale, or the shocks whose name was asked for. */
export function ShocksPage() {
  const [search] = useSearchParams();
  const asked = search.get('q')?.trim() ?? '';
  const [narrowing, narrow, kept] = useNarrowing();
  usePageTitle(asked ? `Shocks named “${asked}”` : 'Shocks by size');
  return (
    <Page>
      <PageHeading lead="Look around without a measure-up. Every size stands on one millimetre scale, from the axis of one mount to the other; the bracken part is the stroke.">
        Shocks by size
      </PageHeading>
      <NotChecked />
      <FindForm key={asked} start={asked} />
      {asked ? (
        <ByName asked={asked} narrowing={narrowing} onNarrow={narrow} />
      ) : (
        <BySize narrowing={narrowing} onNarrow={narrow} search={kept} />
      )}
    </Page>
  );
}

interface ResultsProps {
  narrowing: Narrowing;
  onNarrow: (change: Partial<Narrowing>) => void;
}

function BySize({ narrowing, onNarrow, search }: ResultsProps & { search: string }) {
  const { data, error } = useQuery(sizesQuery(narrowing));
  const all = data?.sizes.reduce((sum, { shocks }) => sum + shocks, 0) ?? 0;
  return (
    <>
      <NarrowSentence narrowing={narrowing} onChange={onNarrow}>
        {data ? `${shocksInWords(all)} in ${data.sizes.length} sizes.` : ''}
      </NarrowSentence>
      {error ? (
        <NotLoaded error={error} what="the sizes" />
      ) : !data ? (
        <Skeleton lines={10} what="Loading sizes" />
      ) : data.sizes.length === 0 ? (
        <Notice title="No shock is like that">
          <p>Nothing in the catalogue is both. Change the sentence above.</p>
        </Notice>
      ) : (
        <SizeRows sizes={data.sizes} search={search} />
      )}
    </>
  );
}

function ByName({ asked, narrowing, onNarrow }: ResultsProps & { asked: string }) {
  const { data, error } = useQuery(shocksQuery({ q: asked, ...narrowing }));
  return (
    <>
      <NarrowSentence narrowing={narrowing} onChange={onNarrow}>
        {data ? `${shocksInWords(data.total)} named “${asked}”.` : ''}
      </NarrowSentence>
      {error ? (
        <NotLoaded error={error} what="the shocks" />
      ) : !data ? (
        <Skeleton lines={8} what="Looking for shocks" />
      ) : data.shocks.length === 0 ? (
        <Notice title={`Nothing here is named “${asked}”`}>
          <p>
            Names are compared word by word. Try fewer words or a size, or{' '}
            <TextLink to="/shocks">look at all sizes</TextLink>.
          </p>
        </Notice>
      ) : (
        <ShockRows shocks={data.shocks} />
      )}
      {data && data.total > data.shocks.length ? (
        <p>These are the {data.shocks.length} cheapest. Type more of the name, or a size, to see others.</p>
      ) : null}
    </>
  );
}
