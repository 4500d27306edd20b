import styled from 'styled-components';
import { errorMessage } from '../../lib/error-code';
import { roleNames } from '../../lib/roles';
import { useViewer } from '../../lib/viewer';
import { announce } from '../../ui/announce';
import { Icon } from '../../ui/icon';
import { Menu } from '../../ui/menu';
import { useSwitchOrganisation } from './use-switch-organisation';

/** The clinic group at work; a menu for members of several. */
export function OrganisationSwitch({ onSwitched }: { onSwitched: () => void }) {
  const { organisation, memberships } = useViewer();
  const switchOrganisation = useSwitchOrganisation();
  if (memberships.length < 2) {
    return (
      <Box as="div">
        <Name name={organisation.name} sites={organisation.sites.length} demo={organisation.demo} />
      </Box>
    );
  }
  async function choose(organisationId: string) {
    if (organisationId === organisation.id) return;
    try {
      await switchOrganisation(organisationId);
      onSwitched();
    } catch (error) {
      announce(errorMessage(error));
    }
  }
  return (
    <Menu
      width="medium"
      groups={[
        {
          id: 'organisations',
          items: memberships.map((choice) => ({
            id: choice.organisationId,
            name: choice.organisationName,
            detail: roleNames(choice.roles),
            selected: choice.organisationId === organisation.id,
            onSelect: () => void choose(choice.organisationId),
          })),
        },
      ]}
      anchor={(props) => (
        <Box {...props} aria-label={`Clinic group: ${organisation.name}`}>
          <Name name={organisation.name} sites={organisation.sites.length} demo={organisation.demo} />
          <Icon name="down" />
          <Icon name="site" />
        </Box>
      )}
    />
  );
}

function Name({ name, sites, demo }: { name: string; sites: number; demo: boolean }) {
  return (
    <Text>
      <b>{name}</b>
      <span>
        {sites} {sites === 1 ? 'site' : 'sites'}
        {demo && ' · demo data'}
      </span>
    </Text>
  );
}

const RAIL = '@media (min-width: 768px) and (max-width: 1279px)';

const Box = styled.button`
  display: flex;
  align-items: center;
  justify-content: space-between;
  gap: 4px;
  width: calc(100% - 16px);
  margin: 4px 0 12px 16px;
  padding: 8px 10px;
  border: 1px solid var(--mw-line-strong);
  border-radius: var(--mw-r-2);
  background: var(--mw-surface);
  color: var(--mw-ink);
  text-align: left;
  &[type='button'] {
    cursor: pointer;
  }
  svg:nth-of-type(2) {
    display: none;
  }
  /* Where the navigation is a rail: the sign alone, and nothing for members of one group. */
  ${RAIL} {
    justify-content: center;
    width: 36px;
    height: 36px;
    margin: 4px 3px 8px;
    padding: 0;
    &:not([type='button']) {
      display: none;
    }
    svg:nth-of-type(1) {
      display: none;
    }
    svg:nth-of-type(2) {
      display: block;
    }
  }
  &[type='button']:hover {
    background: var(--mw-raised);
    border-color: var(--mw-ink-3);
  }
`;

const Text = styled.span`
  min-width: 0;
  ${RAIL} {
    display: none;
  }
  b {
    display: block;
    line-height: 1.25;
  }
  span {
    font-size: 12px;
    color: var(--mw-ink-2);
  }
`;
