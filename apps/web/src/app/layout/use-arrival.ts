import { useEffect, useLayoutEffect, useRef } from 'react';
import { useLocation, useMatches } from 'react-router-dom';
import { pageTitle } from '../../lib/page-title';

const hasTitle = (handle: unknown): handle is { title: string } =>
  typeof handle === 'object' && handle !== null && 'title' in handle;

/** On every change of page: its title, and the focus on its heading, so that a screen reader starts there. */
export function useArrival(): void {
  const { pathname } = useLocation();
  const handle = useMatches().at(-1)?.handle;
  const title = hasTitle(handle) ? handle.title : 'Page not found';

  // In the layout phase, so that a page which knows a better title (in its own effect, later) has the last word.
  useLayoutEffect(() => {
    document.title = pageTitle(title);
  }, [pathname, title]);

  const known = useRef(pathname);
  useEffect(() => {
    if (known.current === pathname) return;
    known.current = pathname;
    return focusHeading();
  }, [pathname]);
}

/**
 * Focuses the heading of the page, also one that comes only with the page's data, or that takes the place of the one
 * focused before; until the reader has gone somewhere else.
 * @returns ends the waiting
 */
function focusHeading(): () => void {
  const onHeading = () => document.activeElement?.matches('[data-page-heading]') ?? false;
  const settle = () =>
    document.querySelector<HTMLElement>('[data-page-heading]')?.focus({ preventScroll: true });
  const waiting = new MutationObserver(() => {
    if (onHeading()) return;
    if (document.activeElement === document.body) settle();
    else waiting.disconnect();
  });
  settle();
  waiting.observe(document.querySelector('#main') ?? document.body, { childList: true, subtree: true });
  return () => waiting.disconnect();
}
