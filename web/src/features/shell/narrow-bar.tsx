import { useId, useState } from 'react';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import styled from 'styled-components';
import { paths } from '../../lib/paths';
import { Wordmark } from '../../ui/brand';
import { Icon } from '../../ui/icon';
import { Rod } from '../../ui/rod';
import type { NavItem } from './nav-items';
import { NavList } from './rod-navigation';

interface NarrowBarProps {
  heading: string;
  items: readonly NavItem[];
  organisation: ReactNode;
  viewer: ReactNode;
}

/** Below 768 px: brand, menu button, and the rod lying across the top. */
export function NarrowBar({ heading, items, organisation, viewer }: NarrowBarProps) {
  const [open, setOpen] = useState(false);
  const menuId = useId();
  return (
    <Bar data-screen-only>
      <Top>
        <Home to={paths.home()} aria-label="Metewand, start page">
          <Wordmark />
        </Home>
        <Toggle
          type="button"
          aria-expanded={open}
          aria-controls={menuId}
          aria-label="Menu"
          onClick={() => setOpen(!open)}
        >
          <Icon name={open ? 'x' : 'menu'} />
        </Toggle>
      </Top>
      <Rod thickness={12} long="40px" short="8px" />
      <Menu id={menuId} aria-label="Main" hidden={!open}>
        {organisation}
        <NavList heading={heading} items={items} onPick={() => setOpen(false)} />
        {viewer}
      </Menu>
    </Bar>
  );
}

const Bar = styled.header`
  background: var(--mw-surface);
  @media (min-width: 768px) {
    display: none;
  }
`;

const Top = styled.div`
  display: flex;
  align-items: center;
  justify-content: space-between;
  height: 52px;
  padding: 0 8px 0 16px;
`;

const Home = styled(Link)`
  text-decoration: none;
`;

const Toggle = styled.button`
  display: grid;
  place-items: center;
  width: 44px;
  height: 44px;
  border: 1px solid var(--mw-line-strong);
  border-radius: var(--mw-r-2);
  background: var(--mw-raised);
  color: var(--mw-ink);
  cursor: pointer;
`;

const Menu = styled.nav`
  padding: 8px 16px 8px 14px;
  background: var(--mw-sunken);
  border-bottom: 1px solid var(--mw-line-strong);
  overflow: hidden;
`;
