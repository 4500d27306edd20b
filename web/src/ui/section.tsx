import { useId } from 'react';
import type { ReactNode } from 'react';
import styled from 'styled-components';

interface SectionProps {
  title?: string;
  /** Quiet unit or count at the right of the title. */
  aside?: ReactNode;
  children: ReactNode;
  /** Inner padding; leave out for tables, which run to the edge. */
  padded?: boolean;
  className?: string;
}

/** A surface with a 2 px ink line on top. Sections never hold sections. */
export function Section({ title, aside, children, padded = false, className }: SectionProps) {
  const titleId = useId();
  return (
    <Surface className={className} aria-labelledby={title ? titleId : undefined}>
      {title && (
        <Header>
          <h2 id={titleId}>{title}</h2>
          {aside && <Aside>{aside}</Aside>}
        </Header>
      )}
      {padded ? <Padded>{children}</Padded> : children}
    </Surface>
  );
}

const Surface = styled.section`
  min-width: 0;
  background: var(--mw-surface);
  border: 1px solid var(--mw-line);
  border-top: 2px solid var(--mw-ink);
`;

const Header = styled.header`
  display: flex;
  align-items: baseline;
  flex-wrap: wrap;
  gap: 4px 12px;
  padding: 12px 16px 8px;
`;

const Aside = styled.span`
  margin-left: auto;
  font-size: 13px;
  color: var(--mw-ink-2);
`;

const Padded = styled.div`
  padding: 0 16px 16px;
  section > &:first-child {
    padding-top: 16px;
  }
`;
