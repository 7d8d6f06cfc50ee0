import { chakra } from '@chakra-ui/react';
import { useEffect } from 'react';
import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { Button } from '../components/button';
import { LinkButton } from '../components/link-button';
import { Notice } from '../components/notice';
import { Page } from '../components/page';
import { PageHeading } from '../components/page-heading';
import { isApiProblem } from '../lib/api-problem';
import { pageTitle } from '../lib/page-title';
import { NotFoundPage } from './not-found-page';

const isMissing = (error: unknown): boolean =>
  (isApiProblem(error) || isRouteErrorResponse(error)) && error.status === 404;

/** A page's code that could not be fetched: offline, or a new version was put up meanwhile. */
const isLostChunk = (error: unknown): boolean =>
  error instanceof TypeError && /import|module/i.test(error.message);

/** Shown in place of a page that failed; what was saved is safe, and the way back is one press. */
export function ErrorPage() {
  const error = useRouteError();
  const missing = isMissing(error);
  useEffect(() => {
    if (!missing) document.title = pageTitle('This page failed', { error: true });
  }, [missing]);
  if (missing) return <NotFoundPage />;
  const known = isApiProblem(error) ? error : undefined;
  return (
    <Page width="text">
      <PageHeading lead="The fault is ours. Answers and orders that were saved are still there.">
        This page could not be shown
      </PageHeading>
      <Notice tone="brick" title={known?.title}>
        {known?.message ??
          (isLostChunk(error)
            ? 'Part of the page could not be fetched. Check your connection, then load it again.'
            : 'Something in the page went wrong. Loading it again often helps.')}
      </Notice>
      <chakra.div display="flex" flexWrap="wrap" gap="3" marginTop="6">
        <Button onClick={() => window.location.reload()}>Load the page again</Button>
        <LinkButton to="/contact" tone="quiet">
          Tell us about it
        </LinkButton>
      </chakra.div>
    </Page>
  );
}
