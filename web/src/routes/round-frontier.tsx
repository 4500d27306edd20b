import { Empty } from '../ui/empty';
import { Page, PageHeader } from '../ui/page';
import { Section } from '../ui/section';

export function Component() {
  return (
    <Page>
      <PageHeader title="Frontier" />
      <Section>
        <Empty title="No search has run yet" />
      </Section>
    </Page>
  );
}
