import { useEffect } from 'react';

export interface TitleOptions {
  /** A form on the page was sent with faults: the title starts with "Error:", which a screen reader says first. */
  error?: boolean;
}

/** The whole document title of a page. */
export function pageTitle(title: string, { error = false }: TitleOptions = {}): string {
  return `${error ? 'Error: ' : ''}${title} – Linkfell`;
}

/** Sets the document title while the component is shown; pages call it where the registry's title is too general. */
export function usePageTitle(title: string, { error = false }: TitleOptions = {}): void {
  useEffect(() => {
    document.title = pageTitle(title, { error });
  }, [title, error]);
}
