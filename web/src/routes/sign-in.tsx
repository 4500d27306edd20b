import { useNavigate, useSearchParams } from 'react-router-dom';
import styled from 'styled-components';
import { SignInForm } from '../features/auth/sign-in-form';
import { SignInPicture } from '../features/auth/sign-in-picture';
import { safeTarget } from '../lib/paths';
import { Wordmark } from '../ui/brand';
import { Rod } from '../ui/rod';

export function Component() {
  const navigate = useNavigate();
  const [params] = useSearchParams();
  const to = params.get('to');
  return (
    <Halves>
      <title>Sign in · Metewand</title>
      <Across>
        <Rod thickness={12} long="40px" short="8px" />
      </Across>
      <Left>
        <header>
          <Wordmark size="large" />
        </header>
        <main>
          <h1>Sign in</h1>
          <Lead>
            {to
              ? 'Sign in to go on to the page you asked for.'
              : 'Choose next year’s equipment with the whole clinic group looking at the same measure.'}
          </Lead>
          <SignInForm onSignedIn={() => void navigate(safeTarget(to), { replace: true })} />
        </main>
        <Foot>
          On a shared computer, sign out when you leave. New here? Ask an administrator of your clinic group
          for an invitation.
        </Foot>
      </Left>
      <Right>
        <SignInPicture />
      </Right>
    </Halves>
  );
}

const Halves = styled.div`
  display: grid;
  grid-template-columns: minmax(0, 620px) minmax(0, 1fr);
  min-height: 100vh;
  background: var(--mw-surface);
  @media (max-width: 1023px) {
    grid-template-columns: minmax(0, 1fr);
    grid-template-rows: auto 1fr;
  }
`;

const Across = styled.div`
  display: none;
  @media (max-width: 1023px) {
    display: block;
  }
`;

const Left = styled.div`
  display: flex;
  flex-direction: column;
  justify-content: space-between;
  gap: 40px;
  padding: 48px clamp(16px, 18%, 112px) 40px;
  main {
    width: 100%;
    max-width: 396px;
  }
  @media (max-width: 1023px) {
    justify-content: flex-start;
    padding-top: 24px;
  }
  @media (max-width: 767px) {
    padding-inline: 16px;
  }
`;

const Lead = styled.p`
  margin: 6px 0 24px;
  color: var(--mw-ink-2);
`;

const Foot = styled.footer`
  max-width: 46ch;
  font-size: 13px;
  color: var(--mw-ink-2);
`;

const Right = styled.div`
  position: relative;
  overflow: hidden;
  background: var(--mw-rod);
  svg {
    position: absolute;
    overflow: visible;
    width: 100%;
    min-width: 820px;
    height: 100%;
  }
  @media (max-width: 1023px) {
    display: none;
  }
`;
