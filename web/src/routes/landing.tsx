import { redirect } from 'react-router-dom';
import { landingPath } from '../lib/landing';
import { currentRound, loadViewer, useViewer } from '../lib/viewer';
import { Empty } from '../ui/empty';
import { Page, PageHeader } from '../ui/page';
import { Section } from '../ui/section';

/** Sends people to where their work lies; shows itself only when there is nothing to go to. */
export async function loader() {
  const path = landingPath(await loadViewer());
  return path ? redirect(path) : null;
}

export function Component() {
  const round = currentRound(useViewer().rounds);
  return (
    <Page>
      <PageHeader
        title="Nothing to do yet"
        sub={round ? `${round.name} is under way.` : 'No round is open in this clinic group.'}
      />
      <Section>{round ? <NoPartInIt /> : <NoRound />}</Section>
    </Page>
  );
}

function NoPartInIt() {
  return (
    <Empty title="Your role has no page in this round">
      What your department needs goes to the purchasing coordinator, who enters it as a candidate. If you also
      coordinate, score or decide, an administrator of your clinic group can give you that role.
    </Empty>
  );
}

function NoRound() {
  return (
    <Empty title="A round begins with a coordinator">
      The purchasing coordinator opens a round once a year. You will find your part of it here.
    </Empty>
  );
}
