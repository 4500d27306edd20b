import { redirect } from 'react-router-dom';
import { landingPath } from '../lib/landing';
import { loadViewer } from '../lib/viewer';
import { Empty } from '../ui/empty';
import { Page, PageHeader } from '../ui/page';
import { Section } from '../ui/section';

/** Sends people to where their work lies; shows itself only when there is nothing to go to. */
export async function loader() {
  const path = landingPath(await loadViewer());
  return path ? redirect(path) : null;
}

export function Component() {
  return (
    <Page>
      <PageHeader title="Nothing to do yet" sub="No round is open to you in this clinic group." />
      <Section>
        <Empty title="A round begins with a coordinator">
          The purchasing coordinator opens a round once a year. You will find your part of it here.
        </Empty>
      </Section>
    </Page>
  );
}
