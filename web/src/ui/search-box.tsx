import { useEffect, useRef, useState } from 'react';
import { TextInput } from '@primer/react';
import { useSearchParams } from 'react-router-dom';
import { Icon } from './icon';
import { withFilter } from './use-table-params';

const TYPING_MS = 250;

interface SearchBoxProps {
  /** What it finds, such as "Find a quote". */
  label: string;
  /** What to type, where the label does not say it. */
  placeholder?: string;
}

/** Searches a moment after the last key; the words live in the address as `?q=`. */
export function SearchBox({ label, placeholder = label }: SearchBoxProps) {
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
    newestSetParams.current((before) => withFilter(before, 'q', words), { replace: true });
  }

  return (
    <TextInput
      type="search"
      block
      aria-label={label}
      placeholder={placeholder}
      leadingVisual={() => <Icon name="search" />}
      value={text}
      onChange={(event) => change(event.target.value)}
    />
  );
}
