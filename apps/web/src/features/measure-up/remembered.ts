const key = 'linkfell-measure-up';

/** Which measure-up this browser worked on last; the answers themselves are on the server. */
export function remember(id: string): void {
  try {
    localStorage.setItem(key, id);
  } catch {
    // A browser that keeps nothing still works; it only forgets where it was.
  }
}

export function remembered(): string | null {
  try {
    return localStorage.getItem(key);
  } catch {
    return null;
  }
}
