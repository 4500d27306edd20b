import type { ReactNode } from 'react';
import styled from 'styled-components';
import { Wordmark } from './brand';
import { Rod } from './rod';

/** A page outside the shell: brand, rod across the top, content. */
export function StandAlone({ children }: { children: ReactNode }) {
  return (
    <>
      <Header>
        <Wordmark />
      </Header>
      <Rod thickness={12} long="40px" short="8px" />
      <main>{children}</main>
    </>
  );
}

const Header = styled.header`
  display: flex;
  align-items: center;
  height: 56px;
  padding: 0 24px;
  background: var(--mw-surface);
`;
