import { isRouteErrorResponse, useRevalidator, useRouteError } from 'react-router-dom';
import { errorCode, errorMessage, requestId } from '../lib/error-code';
import { paths } from '../lib/paths';
import { Button, ButtonLink } from '../ui/button';
import { ProblemPage } from '../ui/problem-page';
import { StandAlone } from '../ui/stand-alone';
import { NoSuchPage } from './not-found';

/** What a page turns into when it cannot be loaded or drawn. */
export function RouteError() {
  const error = useRouteError();
  const { revalidate, state } = useRevalidator();
  if (isRouteErrorResponse(error) && error.status === 404) return <NoSuchPage />;
  const code = errorCode(error);
  if (code === 'NOT_FOUND') return <Gone />;
  if (code === 'FORBIDDEN') return <Forbidden />;
  return (
    <ProblemPage
      title={code === 'OFFLINE' ? 'The server did not answer' : 'This page could not be shown'}
      what={errorMessage(error)}
      safe="What you saved before is safe."
      supportNumber={requestId(error)}
      ways={[
        {
          title: 'Try again',
          note: 'Loads this page once more.',
          action: (
            <Button variant="primary" loading={state === 'loading'} onClick={() => void revalidate()}>
              Try again
            </Button>
          ),
        },
        {
          title: 'Go to the start page',
          action: <ButtonLink to={paths.home()}>Open the start page</ButtonLink>,
        },
      ]}
    />
  );
}

/** The same outside the shell. */
export function StandAloneError() {
  return (
    <StandAlone>
      <RouteError />
    </StandAlone>
  );
}

function Gone() {
  return (
    <ProblemPage
      title="It is not here"
      what="What this address points at may have been removed, or it belongs to another clinic group of yours."
      ways={[
        {
          title: 'Go to the start page',
          note: 'In another clinic group? Switch to it at the left, then open the link again.',
          action: (
            <ButtonLink to={paths.home()} variant="primary">
              Open the start page
            </ButtonLink>
          ),
        },
      ]}
    />
  );
}

function Forbidden() {
  return (
    <ProblemPage
      title="Your role does not include this page"
      what="An administrator of your clinic group can give you a role that does."
      ways={[
        {
          title: 'Go to the start page',
          action: (
            <ButtonLink to={paths.home()} variant="primary">
              Open the start page
            </ButtonLink>
          ),
        },
      ]}
    />
  );
}
