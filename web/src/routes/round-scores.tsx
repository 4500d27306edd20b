import { Empty } from '../ui/empty';
import { Page, PageHeader } from '../ui/page';
import { Section } from '../ui/section';

export function Component() {
  return (
    <Page>
      <PageHeader title="Scoring" />
      <Section>
        <Empty title="Nothing to score yet" />
      </Section>
    </Page>
  );
}
