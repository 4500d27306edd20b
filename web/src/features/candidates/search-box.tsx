import { useEffect, useRef, useState } from 'react';
import { TextInput } from '@primer/react';
import { useSearchParams } from 'react-router-dom';
import { Icon } from '../../ui/icon';

const TYPING_MS = 250;

/** Searches a moment after the last key; the words live in the address. */
export function SearchBox() {
  const [params, setParams] = useSearchParams();
  const inAddress = params.get('q') ?? '';
  const [text, setText] = useState(inAddress);
  const [sent, setSent] = useState(inAddress);
  const [seen, setSeen] = useState(inAddress);
  // A change that did not come from here, such as Back or cleared filters; what is being typed stays otherwise.
  if (inAddress !== seen) {
    setSeen(inAddress);
    if (inAddress !== sent) setText(inAddress);
  }
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => () => clearTimeout(timer.current), []);
  // The address may change between the last key and the search; the search must build on the newest.
  const newestSetParams = useRef(setParams);
  useEffect(() => {
    newestSetParams.current = setParams;
  }, [setParams]);

  function change(next: string) {
    setText(next);
    clearTimeout(timer.current);
    timer.current = setTimeout(() => search(next.trim()), TYPING_MS);
  }

  // Replaces the address, so that Back leaves the search and does not spell it backwards.
  function search(words: string) {
    setSent(words);
    newestSetParams.current((before) => withSearch(before, words), { replace: true });
  }

  return (
    <TextInput
      type="search"
      aria-label="Find a need"
      placeholder="Find a need"
      leadingVisual={() => <Icon name="search" />}
      value={text}
      onChange={(event) => change(event.target.value)}
    />
  );
}

function withSearch(before: URLSearchParams, words: string): URLSearchParams {
  const next = new URLSearchParams(before);
  next.delete('page');
  if (words) next.set('q', words);
  else next.delete('q');
  return next;
}
