import { useEffect, useRef } from 'react';
import type { KeyboardEvent, ReactNode } from 'react';
import styled from 'styled-components';
import { IconButton } from './button';
import { Dialog } from './dialog';
import { useMedia } from './use-media';

interface SidePanelProps {
  title: string;
  /** Quiet line above the title: code, department, site. */
  over?: ReactNode;
  onClose: () => void;
  /** Actions at the foot. */
  footer?: ReactNode;
  /** px, 308–376. */
  width?: number;
  children: ReactNode;
}

/**
 * Details of the chosen row, flush with the window's edge; the table beside it gives way. Give it to `<Page panel>`.
 * Between 768 and 1279 px it lies over the content as a dialog, below that it fills the window.
 */
export function SidePanel({ title, over, onClose, footer, width = 308, children }: SidePanelProps) {
  const beside = useMedia('(min-width: 1280px)');
  if (!beside) {
    return (
      <Dialog
        title={title}
        sub={typeof over === 'string' ? over : undefined}
        onClose={onClose}
        position="right"
        footer={footer}
      >
        {children}
      </Dialog>
    );
  }
  return <Beside {...{ title, over, onClose, footer, width, children }} />;
}

function Beside({ title, over, onClose, footer, width, children }: SidePanelProps) {
  const cameFrom = useRef<Element | null>(null);
  useEffect(() => {
    cameFrom.current = document.activeElement;
    return () => (cameFrom.current as HTMLElement | null)?.focus();
  }, []);
  function keyDown(event: KeyboardEvent) {
    if (event.key === 'Escape' && !event.defaultPrevented) onClose();
  }
  return (
    <Aside aria-label={title} onKeyDown={keyDown} style={{ width }} data-screen-only>
      <Top>
        <div>
          {over && <p className="muted small">{over}</p>}
          <h2>{title}</h2>
        </div>
        <IconButton icon="x" label="Close panel" variant="quiet" onClick={onClose} />
      </Top>
      <Body>{children}</Body>
      {footer && <Footer>{footer}</Footer>}
    </Aside>
  );
}

const Aside = styled.aside`
  position: sticky;
  top: var(--mw-strip);
  height: calc(100vh - var(--mw-strip));
  display: flex;
  flex-direction: column;
  background: var(--mw-surface);
  border-left: 1px solid var(--mw-line-strong);
  h2 {
    font-size: var(--mw-t-20);
    line-height: var(--mw-lh-tight);
  }
`;

const Top = styled.div`
  display: flex;
  justify-content: space-between;
  align-items: flex-start;
  gap: 12px;
  padding: 16px 18px 8px;
`;

const Body = styled.div`
  flex: 1;
  min-height: 0;
  overflow: auto;
  padding: 0 18px 16px;
`;

const Footer = styled.div`
  display: flex;
  flex-wrap: wrap;
  gap: 8px;
  padding: 12px 18px 16px;
`;
