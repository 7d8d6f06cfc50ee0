import { LinkButton } from './link-button';
import { Page } from './page';
import { PageHeading } from './page-heading';
import { isApiProblem } from '../lib/api-problem';

/** A page whose data could not be had: what is the matter, and the next step. */
export function LoadFailed({
  error,
  what,
  next = { to: '/', label: 'To the front page' },
  gone = `There are no such things here, or this browser has not opened ${what} before.`,
}: {
  error: Error;
  what: string;
  /** Where the reader can go on. */
  next?: { to: string; label: string };
  /** What may be the matter where nothing is at this address. */
  gone?: string;
}) {
  const missing = isApiProblem(error) && error.status === 404;
  return (
    <Page width="text">
      <PageHeading
        lead={
          missing
            ? gone
            : isApiProblem(error)
              ? (error.detail ?? error.title)
              : 'Something went wrong on our side.'
        }
      >
        {missing ? `We cannot show ${what}` : `Could not load ${what}`}
      </PageHeading>
      <LinkButton to={next.to}>{next.label}</LinkButton>
    </Page>
  );
}
