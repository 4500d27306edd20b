import styled from 'styled-components';

/** The mark alone: a rod whose five graduations draw an M. Follows the theme. */
export function Mark({ size = 28 }: { size?: number }) {
  return (
    <svg viewBox="0 0 32 32" width={size} height={size} aria-hidden>
      <rect x="2" y="4" width="28" height="7" fill="var(--mw-rod)" />
      <path
        d="M2 11h4v18H2zM8 11h4v7H8zM14 11h4v12h-4zM20 11h4v7h-4zM26 11h4v18h-4z"
        fill="var(--mw-action)"
      />
    </svg>
  );
}

/** Mark and name. */
export function Wordmark({ size = 'medium' }: { size?: 'medium' | 'large' }) {
  return (
    <Line $size={size}>
      <Mark />
      <span>Metewand</span>
    </Line>
  );
}

const Line = styled.span<{ $size: 'medium' | 'large' }>`
  display: inline-flex;
  align-items: center;
  gap: 10px;
  font-weight: 800;
  font-size: ${({ $size }) => ($size === 'large' ? 22 : 18)}px;
  letter-spacing: -0.02em;
  color: var(--mw-ink);
`;
