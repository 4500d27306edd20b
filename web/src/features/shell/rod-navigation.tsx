import type { ReactNode } from 'react';
import { Link, NavLink } from 'react-router-dom';
import styled from 'styled-components';
import { paths } from '../../lib/paths';
import { Mark } from '../../ui/brand';
import { Icon } from '../../ui/icon';
import { Rod } from '../../ui/rod';
import type { NavItem } from './nav-items';

interface RodNavigationProps {
  heading: string;
  items: readonly NavItem[];
  /** Clinic-group switch, above the items. */
  organisation: ReactNode;
  /** The member's menu, at the foot. */
  viewer: ReactNode;
}

/** The rod along the left edge with the pages hanging on its graduations. */
export function RodNavigation({ heading, items, organisation, viewer }: RodNavigationProps) {
  return (
    <Nav aria-label="Main" data-screen-only>
      <Measure orientation="vertical" thickness={14} long="40px" short="8px" />
      <Brand to={paths.home()} aria-label="Metewand, start page">
        <Mark />
        <span>Metewand</span>
      </Brand>
      {organisation}
      <NavList heading={heading} items={items} />
      <Foot>{viewer}</Foot>
    </Nav>
  );
}

/** The items alone, as the narrow menu shows them too. */
export function NavList({
  heading,
  items,
  onPick,
}: {
  heading: string;
  items: readonly NavItem[];
  onPick?: () => void;
}) {
  if (items.length === 0) return null;
  return (
    <>
      <Heading>{heading}</Heading>
      <ul>
        {items.map((item) => (
          <li key={item.to}>
            <Item to={item.to} onClick={onPick} title={item.name}>
              <Icon name={item.icon} />
              <span>{item.name}</span>
              {item.count && <Count $open={item.open ?? false}>{item.count}</Count>}
            </Item>
          </li>
        ))}
      </ul>
    </>
  );
}

const RAIL = '@media (min-width: 768px) and (max-width: 1279px)';

const Nav = styled.nav`
  position: sticky;
  top: 0;
  height: 100vh;
  overflow-y: auto;
  overflow-x: hidden;
  display: flex;
  flex-direction: column;
  padding: 0 12px 0 14px;
  background: var(--mw-sunken);
  ${RAIL} {
    padding-right: 0;
  }
  @media (max-width: 767px) {
    display: none;
  }
`;

const Measure = styled(Rod)`
  position: absolute;
  inset: 0 auto 0 0;
`;

const Brand = styled(Link)`
  display: flex;
  align-items: center;
  gap: 10px;
  flex: none;
  height: 56px;
  padding-left: 16px;
  font-weight: 800;
  font-size: 18px;
  letter-spacing: -0.02em;
  color: var(--mw-ink);
  text-decoration: none;
  ${RAIL} {
    padding-left: 7px;
    span {
      display: none;
    }
  }
`;

const Heading = styled.h2`
  padding: 10px 0 4px 22px;
  font-size: 12px;
  font-weight: 600;
  color: var(--mw-ink-2);
  ${RAIL} {
    position: absolute;
    width: 1px;
    height: 1px;
    padding: 0;
    overflow: hidden;
    clip-path: inset(50%);
  }
`;

const Item = styled(NavLink)`
  position: relative;
  display: flex;
  align-items: center;
  height: 36px;
  padding: 0 8px 0 22px;
  color: var(--mw-ink);
  font-weight: 500;
  text-decoration: none;
  svg {
    display: none;
  }
  &:hover {
    background: var(--mw-line);
  }
  &::before {
    content: '';
    position: absolute;
    left: 0;
    top: 50%;
    width: 12px;
    height: 1px;
    background: var(--mw-line-strong);
  }
  &[aria-current] {
    font-weight: 700;
  }
  &[aria-current]::before {
    left: -14px;
    top: 7px;
    width: 28px;
    height: 22px;
    background: var(--mw-action);
    clip-path: polygon(0 0, 68% 0, 100% 50%, 68% 100%, 0 100%);
  }
  &[aria-current]::after {
    content: '';
    position: absolute;
    left: 20px;
    right: 0;
    bottom: 3px;
    height: 2px;
    background: var(--mw-action);
  }
  @media (forced-colors: active) {
    &[aria-current]::before,
    &[aria-current]::after {
      background: CanvasText;
    }
  }
  @media (max-width: 767px) {
    height: 44px;
  }
  ${RAIL} {
    height: 44px;
    padding: 0;
    justify-content: center;
    svg {
      display: block;
    }
    span {
      position: absolute;
      width: 1px;
      height: 1px;
      overflow: hidden;
      clip-path: inset(50%);
    }
    &::before {
      width: 5px;
    }
    &[aria-current]::before {
      top: 11px;
      width: 20px;
    }
    &[aria-current]::after {
      left: 12px;
      right: 4px;
    }
  }
`;

const Count = styled.span<{ $open: boolean }>`
  margin-left: auto;
  font-size: 12px;
  font-weight: 600;
  color: var(${({ $open }) => ($open ? '--mw-caution' : '--mw-ink-2')});
`;

const Foot = styled.div`
  margin: auto 0 0 2px;
  border-top: 1px solid var(--mw-line);
`;
