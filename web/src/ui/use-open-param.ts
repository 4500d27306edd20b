import { useSearchParams } from 'react-router-dom';
import type { ShouldRevalidateFunctionArgs } from 'react-router-dom';

/** Which dialog of the page is open, kept in the address as `?open=ceiling`. */
export function useOpenParam(): [open: string | null, setOpen: (name: string | null) => void] {
  const [params, setParams] = useSearchParams();
  function setOpen(name: string | null) {
    setParams((before) => {
      const next = new URLSearchParams(before);
      if (name) next.set('open', name);
      else next.delete('open');
      return next;
    });
  }
  return [params.get('open'), setOpen];
}

/** For a route's `shouldRevalidate`: opening and closing what `names` stand for in the address asks for no new data. */
export function unlessOnly(...names: string[]) {
  return ({ currentUrl, nextUrl, defaultShouldRevalidate }: ShouldRevalidateFunctionArgs): boolean => {
    if (currentUrl.href === nextUrl.href) return defaultShouldRevalidate;
    return without(currentUrl, names) === without(nextUrl, names) ? false : defaultShouldRevalidate;
  };
}

function without(url: URL, names: readonly string[]): string {
  const params = new URLSearchParams(url.search);
  names.forEach((name) => params.delete(name));
  return `${url.pathname}?${params}`;
}
