import styled from 'styled-components';

/** A person as a square with initials. Decoration: the name stands beside it. */
export function Initials({ name, size = 'medium' }: { name: string; size?: 'small' | 'medium' }) {
  return (
    <Square $size={size} aria-hidden>
      {initialsOf(name)}
    </Square>
  );
}

/** Initials and name in a row. */
export function Person({ name }: { name: string }) {
  return (
    <span className="row">
      <Initials name={name} size="small" />
      {name}
    </span>
  );
}

/** "Dr Ruben Adeyi" → "RA": titles are no part of a name. */
function initialsOf(name: string): string {
  const words = name.split(/\s+/u).filter((word) => word && !/^(Dr|Prof|Mr|Mrs|Ms)\.?$/iu.test(word));
  return [words[0], words.length > 1 ? words.at(-1) : undefined]
    .map((word) => [...(word ?? '')][0] ?? '')
    .join('')
    .toUpperCase();
}

const Square = styled.span<{ $size: 'small' | 'medium' }>`
  display: inline-grid;
  place-items: center;
  flex: none;
  width: ${({ $size }) => ($size === 'small' ? 22 : 28)}px;
  height: ${({ $size }) => ($size === 'small' ? 22 : 28)}px;
  border-radius: 2px;
  background: var(--mw-action-soft);
  color: var(--mw-ink);
  font-size: ${({ $size }) => ($size === 'small' ? 10 : 11)}px;
  font-weight: 700;
  letter-spacing: 0.02em;
`;
