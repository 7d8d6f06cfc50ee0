import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useParams, useSearchParams } from 'react-router-dom';
import { Button } from '../../components/button';
import { LoadFailed } from '../../components/load-failed';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Skeleton } from '../../components/skeleton';
import { TextLink } from '../../components/text-link';
import { isApiProblem } from '../../lib/api-problem';
import { usePageTitle } from '../../lib/page-title';
import { useMedia } from '../../lib/use-media';
import { matchesQueryOptions } from './api';
import { MatchCards } from './match-cards';
import { sheetOf } from './match-groups';
import { MatchTable } from './match-table';
import { Sentence } from './sentence';

/** How many rows are fetched at once. */
const step = 60;

/** The fitting sheet. */
export function MatchesPage() {
  const { id = '' } = useParams();
  const [search, setSearch] = useSearchParams();
  const text = search.toString();
  const { data: view, error, isPlaceholderData } = useQuery(matchesQueryOptions(id, text ? `?${text}` : ''));
  usePageTitle(view ? `Fitting sheet: ${view.title}` : 'Fitting sheet');
  const sheet = useMemo(() => (view && view.rows.length > 0 ? sheetOf(view) : null), [view]);
  const change = (words: Record<string, string>, without: readonly string[] = []) =>
    setSearch(
      (before) =>
        new URLSearchParams({
          ...Object.fromEntries([...before].filter(([name]) => !without.includes(name))),
          ...words,
        }),
      { replace: true, preventScrollReset: true },
    );
  const wide = useMedia('(min-width: 64rem)');
  if (error) {
    return (
      <LoadFailed
        error={error}
        what="this fitting sheet"
        next={
          isApiProblem(error) && error.status === 409
            ? { to: `/measure-up/${id}/frame`, label: 'Choose your frame' }
            : { to: '/measure-up', label: 'Your measure-up' }
        }
      />
    );
  }
  if (!view) {
    return (
      <Page>
        <PageHeading>Fitting sheet</PageHeading>
        <Skeleton lines={8} what="Judging every shock on sale for your bike" />
      </Page>
    );
  }
  return (
    <Page>
      <PageHeading above="Fitting sheet" lead={view.sheetNote}>
        {view.title}
      </PageHeading>
      <Sentence
        view={view}
        // A new sentence is read from its top again.
        onChange={(words) => change(words, ['limit'])}
      />
      <chakra.p role="status" srOnly>
        {view.rows.length} shocks shown{view.more > 0 ? `, ${view.more} more below` : ''}
        {view.leftOut > 0 ? `, ${view.leftOut} left out` : ''}
      </chakra.p>
      <chakra.div aria-busy={isPlaceholderData} opacity={isPlaceholderData ? '0.6' : '1'}>
        {sheet ? (
          wide ? (
            <MatchTable view={view} sheet={sheet} />
          ) : (
            <MatchCards view={view} sheet={sheet} />
          )
        ) : (
          <Notice tone="heather" title="Nothing on sale fits with this sentence">
            <p>
              {view.leftOut > 0
                ? `${view.leftOut} shocks are left out by spring, reservoir or price. Change the sentence above, `
                : ''}
              show what won’t fit and why, or{' '}
              <TextLink to={`/measure-up/${id}/check`}>look at your answers again</TextLink>.
            </p>
          </Notice>
        )}
      </chakra.div>
      {view.more > 0 ? (
        <chakra.div marginTop="6">
          <Button
            tone="plain"
            busy={isPlaceholderData && 'Fetching more'}
            onClick={() => change({ limit: String(view.rows.length + step) })}
          >
            Show {Math.min(step, view.more)} more of {view.more}
          </Button>
        </chakra.div>
      ) : null}
      <chakra.p marginTop="8" color="slate" maxWidth="line">
        {view.leftOut > 0 && sheet ? `${view.leftOut} more are left out by spring, reservoir or price. ` : ''}
        Something wrong? <TextLink to={`/measure-up/${id}/check`}>Change your answers</TextLink>. Our figures
        are starting points; the makers’ manuals come before anything here.
      </chakra.p>
    </Page>
  );
}
