import { ActionList, ActionMenu } from '@primer/react';
import styled from 'styled-components';
import { roleNames } from '../../lib/roles';
import { chooseTheme, useTheme } from '../../lib/theme';
import type { Theme } from '../../lib/theme';
import { useViewer } from '../../lib/viewer';
import { Initials } from '../../ui/initials';
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
    <ActionMenu>
      <ActionMenu.Anchor>
        <Me type="button" aria-label={`${membership.name}, your menu`}>
          <Initials name={membership.name} />
          <Text>
            <b>{membership.name}</b>
            <span>{membership.title || roleNames(membership.roles)}</span>
          </Text>
        </Me>
      </ActionMenu.Anchor>
      <ActionMenu.Overlay width="small" side="outside-top">
        <ActionList>
          <ActionList.Group selectionVariant="single">
            <ActionList.GroupHeading>Theme</ActionList.GroupHeading>
            {THEMES.map(([value, name]) => (
              <ActionList.Item key={value} selected={theme === value} onSelect={() => chooseTheme(value)}>
                {name}
              </ActionList.Item>
            ))}
          </ActionList.Group>
          <ActionList.Divider />
          <ActionList.Item onSelect={() => void signOut()}>
            Sign out
            <ActionList.Description variant="block">{email}</ActionList.Description>
          </ActionList.Item>
        </ActionList>
      </ActionMenu.Overlay>
    </ActionMenu>
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
