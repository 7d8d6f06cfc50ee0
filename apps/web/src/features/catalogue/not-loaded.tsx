import { Notice } from '../../components/notice';
import { isApiProblem } from '../../lib/api-problem';

/** A part of a page whose data could not be had; the rest of it stands. */
export function NotLoaded({ error, what }: { error: Error; what: string }) {
  return (
    <Notice tone="brick" title={`Could not load ${what}`} announce="alert">
      <p>
        {isApiProblem(error) && error.status === 0
          ? 'We could not reach Linkfell. Check your connection, then load the page again.'
          : 'Something went wrong on our side. Try again in a moment.'}
      </p>
    </Notice>
  );
}
