import type { ReactNode } from 'react';
import styled from 'styled-components';
import { Icon } from './icon';
import { Page } from './page';

interface WayOut {
  title: string;
  note?: string;
  /** A button or a link that looks like one. */
  action: ReactNode;
}

interface ProblemPageProps {
  /** What happened. */
  title: string;
  /** In plain words, with the figures. */
  what: string;
  /** What is safe. */
  safe?: string;
  ways: readonly WayOut[];
  /** Number to give to support; comes last and small. */
  supportNumber?: string;
}

/** A page that cannot be shown: what happened, what is safe, the ways out. */
export function ProblemPage({ title, what, safe, ways, supportNumber }: ProblemPageProps) {
  return (
    <Page>
      <title>{`${title} · Metewand`}</title>
      <Box>
        <Top role="alert">
          <Icon name="warn" size={28} />
          <div>
            <h1>{title}</h1>
            <p>{what}</p>
            {safe && <p>{safe}</p>}
          </div>
        </Top>
        <Ways>
          <h2>Ways out</h2>
          <ul>
            {ways.map((way) => (
              <li key={way.title}>
                <div>
                  <b>{way.title}</b>
                  {way.note && <p className="muted small">{way.note}</p>}
                </div>
                {way.action}
              </li>
            ))}
          </ul>
          {supportNumber && (
            <p className="tiny muted">If you write to support, give them the number {supportNumber}.</p>
          )}
        </Ways>
      </Box>
    </Page>
  );
}

const Box = styled.section`
  width: 100%;
  max-width: 860px;
  background: var(--mw-surface);
  border: 1px solid var(--mw-line);
  border-top: 4px solid var(--mw-bad);
`;

const Top = styled.div`
  display: flex;
  gap: 16px;
  padding: 20px 24px;
  background: var(--mw-bad-soft);
  h1 {
    font-size: 16px;
  }
  p {
    margin-top: 4px;
    max-width: 66ch;
  }
  svg {
    color: var(--mw-bad);
  }
`;

const Ways = styled.div`
  padding: 16px 24px 20px;
  h2 {
    font-size: 14px;
    padding-bottom: 8px;
  }
  li {
    display: flex;
    align-items: center;
    justify-content: space-between;
    flex-wrap: wrap;
    gap: 8px 16px;
    padding: 12px 0;
    border-top: 1px solid var(--mw-line);
  }
  > p {
    margin-top: 12px;
  }
`;
