import { Empty } from '../ui/empty';
import { Page, PageHeader } from '../ui/page';
import { Section } from '../ui/section';

export function Component() {
  return (
    <Page>
      <PageHeader title="Candidates" />
      <Section>
        <Empty title="Nothing has been asked for yet" />
      </Section>
    </Page>
  );
}
