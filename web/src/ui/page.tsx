import type { ReactNode } from 'react';
import styled from 'styled-components';

interface PageHeaderProps {
  /** The answer first, in a sentence; also the title of the window unless `windowTitle` is given. */
  title: string;
  windowTitle?: string;
  /** One quiet line below. */
  sub?: ReactNode;
  /** Buttons at the right: one primary. */
  actions?: ReactNode;
}

export function PageHeader({ title, windowTitle = title, sub, actions }: PageHeaderProps) {
  return (
    <Head>
      <title>{`${windowTitle} · Metewand`}</title>
      <div>
        <h1>{title}</h1>
        {sub && <Sub>{sub}</Sub>}
      </div>
      {actions && <Actions data-screen-only>{actions}</Actions>}
    </Head>
  );
}

/** The body of a page: padding, one column, and room for a `<SidePanel>` at the right. */
export function Page({ children, panel }: { children: ReactNode; panel?: ReactNode }) {
  return (
    <Frame $panel={Boolean(panel)}>
      <Content>{children}</Content>
      {panel}
    </Frame>
  );
}

const Frame = styled.div<{ $panel: boolean }>`
  flex: 1;
  min-width: 0;
  display: grid;
  grid-template-columns: minmax(0, 1fr) ${({ $panel }) => ($panel ? 'auto' : '')};
  @media (max-width: 1023px) {
    grid-template-columns: minmax(0, 1fr);
    align-content: start;
  }
`;

const Content = styled.div`
  min-width: 0;
  padding: 20px 24px 24px;
  display: flex;
  flex-direction: column;
  @media (max-width: 767px) {
    padding: 16px;
  }
`;

const Head = styled.div`
  display: flex;
  align-items: flex-end;
  flex-wrap: wrap;
  gap: 12px 24px;
  margin-bottom: 16px;
  @media (max-width: 767px) {
    h1 {
      font-size: 22px;
    }
  }
`;

const Sub = styled.p`
  margin-top: 4px;
  max-width: 76ch;
  color: var(--mw-ink-2);
`;

const Actions = styled.div`
  margin-left: auto;
  display: flex;
  flex-wrap: wrap;
  gap: 8px;
  @media (max-width: 767px) {
    margin-left: 0;
  }
`;
