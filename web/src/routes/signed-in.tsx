import { useEffect, useRef } from 'react';
import { Outlet, useLocation, useNavigation, useParams } from 'react-router-dom';
import styled from 'styled-components';
import { ViewerMenu } from '../features/auth/viewer-menu';
import { OrganisationSwitch } from '../features/organisations/organisation-switch';
import { NarrowBar } from '../features/shell/narrow-bar';
import { roundItems } from '../features/shell/nav-items';
import { RodNavigation } from '../features/shell/rod-navigation';
import { RoundStrip } from '../features/shell/round-strip';
import { paths } from '../lib/paths';
import { useCan } from '../lib/use-can';
import { currentRound, loadViewer, useViewer } from '../lib/viewer';
import { useNarrow } from '../ui/use-media';

export async function loader() {
  await loadViewer();
  return null;
}

/** The shell: rod navigation, strip of the round, and the page. */
export function Component() {
  const { rounds } = useViewer();
  const { roundId } = useParams();
  const can = useCan();
  const narrow = useNarrow();
  const main = useFocusOnPageChange();
  const busy = useNavigation().state === 'loading';
  const round = rounds.find(({ id }) => id === roundId) ?? currentRound(rounds);
  const navigation = {
    heading: round?.name ?? 'No round yet',
    items: round ? roundItems(round, can) : [],
    organisation: <OrganisationSwitch onSwitched={() => window.location.assign(paths.home())} />,
    viewer: <ViewerMenu />,
  };
  return (
    <Shell>
      <SkipLink href="#main" className="visually-hidden">
        Skip to the content
      </SkipLink>
      {narrow ? <NarrowBar {...navigation} /> : <RodNavigation {...navigation} />}
      <Side>
        {round && <RoundStrip round={round} />}
        <Main id="main" ref={main} tabIndex={-1} aria-busy={busy}>
          <Outlet />
          <div data-portal-root />
        </Main>
      </Side>
    </Shell>
  );
}

/** A new page starts at its content for the keyboard and for screen readers, as a full load would. */
function useFocusOnPageChange() {
  const main = useRef<HTMLElement>(null);
  const { pathname } = useLocation();
  const shown = useRef(pathname);
  useEffect(() => {
    if (shown.current === pathname) return;
    shown.current = pathname;
    main.current?.focus({ preventScroll: true });
  }, [pathname]);
  return main;
}

const Shell = styled.div`
  display: grid;
  grid-template-columns: var(--mw-nav) minmax(0, 1fr);
  min-height: 100vh;
  @media (max-width: 1279px) {
    grid-template-columns: 56px minmax(0, 1fr);
  }
  @media (max-width: 767px) {
    display: block;
  }
  @media print {
    display: block;
  }
`;

const SkipLink = styled.a`
  position: fixed;
  z-index: 50;
  top: 8px;
  left: 24px;
  padding: 8px 12px;
  background: var(--mw-raised);
`;

const Side = styled.div`
  min-width: 0;
  display: flex;
  flex-direction: column;
`;

const Main = styled.main`
  flex: 1;
  min-width: 0;
  display: flex;
  flex-direction: column;
  outline: none;
`;
