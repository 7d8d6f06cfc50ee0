import { useSearchParams } from 'react-router-dom';
import { narrowingOf, type Narrowing } from './api';

/** The narrowing in the address, so that it survives a reload and can be sent to somebody. */
export function useNarrowing(): [Narrowing, (change: Partial<Narrowing>) => void, string] {
  const [search, setSearch] = useSearchParams();
  const change = (words: Partial<Narrowing>) =>
    setSearch(
      (before) => {
        const next = new URLSearchParams(before);
        for (const [name, value] of Object.entries(words)) {
          if (value === 'either') next.delete(name);
          else next.set(name, value);
        }
        return next;
      },
      { replace: true },
    );
  const kept = new URLSearchParams([...search].filter(([name]) => name === 'spring' || name === 'reservoir'));
  return [narrowingOf(search), change, kept.size > 0 ? `?${kept.toString()}` : ''];
}
