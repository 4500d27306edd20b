import { paths } from '../lib/paths';
import { ButtonLink } from '../ui/button';
import { ProblemPage } from '../ui/problem-page';
import { StandAlone } from '../ui/stand-alone';

export function Component() {
  return (
    <StandAlone>
      <NoSuchPage />
    </StandAlone>
  );
}

/** What to show where there is no page. */
export function NoSuchPage() {
  return (
    <ProblemPage
      title="There is no such page"
      what="Nothing lives at this address. The link may be cut off, or what it pointed at was removed."
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
