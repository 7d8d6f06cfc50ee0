/** What jsdom lacks and our components use: media queries that can be set, native dialogs, scrolling. */
let matching = new Set<string>();

/** Says which media queries are true in the tests that follow; none by default. */
export function setMedia(...queries: string[]): void {
  matching = new Set(queries);
}

export function installBrowserGaps(): void {
  window.matchMedia = (query: string) =>
    Object.assign(new EventTarget(), {
      media: query,
      matches: matching.has(query),
      onchange: null,
      addListener: () => undefined,
      removeListener: () => undefined,
    });
  window.scrollTo = () => undefined;
  HTMLDialogElement.prototype.showModal = function showModal() {
    this.open = true;
  };
  HTMLDialogElement.prototype.close = function close() {
    this.open = false;
    this.dispatchEvent(new Event('close'));
  };
}
