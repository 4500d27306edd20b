import styled from 'styled-components';
import { roleNames } from '../../lib/roles';
import { chooseTheme, useTheme } from '../../lib/theme';
import type { Theme } from '../../lib/theme';
import { useViewer } from '../../lib/viewer';
import { Initials } from '../../ui/initials';
import { Menu } from '../../ui/menu';
import { useSignOut } from './use-sign-out';

const THEMES: readonly [Theme, string][] = [
  ['auto', 'As the system'],
  ['light', 'Light'],
  ['dark', 'Dark'],
];

/** The member's own name; opens theme and sign-out. */
export function ViewerMenu() {
  const { membership, email } = useViewer();
  const theme = useTheme();
  const signOut = useSignOut();
  return (
    <Menu
      side="outside-top"
      groups={[
        {
          id: 'theme',
          heading: 'Theme',
          items: THEMES.map(([value, name]) => ({
            id: value,
            name,
            selected: theme === value,
            onSelect: () => chooseTheme(value),
          })),
        },
        {
          id: 'session',
          items: [{ id: 'sign-out', name: 'Sign out', detail: email, onSelect: () => void signOut() }],
        },
      ]}
      anchor={(props) => (
        <Me {...props} aria-label={`${membership.name}, your menu`}>
          <Initials name={membership.name} />
          <Text>
            <b>{membership.name}</b>
            <span>{membership.title || roleNames(membership.roles)}</span>
          </Text>
        </Me>
      )}
    />
  );
}

const Me = styled.button`
  display: flex;
  align-items: center;
  gap: 10px;
  width: 100%;
  min-height: 54px;
  padding: 8px 4px 8px 16px;
  border: 0;
  background: none;
  color: var(--mw-ink);
  text-align: left;
  cursor: pointer;
  &:hover {
    background: var(--mw-line);
  }
  @media (min-width: 768px) and (max-width: 1279px) {
    padding: 8px 0;
    justify-content: center;
  }
`;

const Text = styled.span`
  min-width: 0;
  line-height: 1.25;
  b,
  span {
    display: block;
    overflow: hidden;
    text-overflow: ellipsis;
  }
  span {
    font-size: 12px;
    color: var(--mw-ink-2);
  }
  @media (min-width: 768px) and (max-width: 1279px) {
    display: none;
  }
`;
