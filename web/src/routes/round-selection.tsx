import { Empty } from '../ui/empty';
import { Page, PageHeader } from '../ui/page';
import { Section } from '../ui/section';

export function Component() {
  return (
    <Page>
      <PageHeader title="Approval" />
      <Section>
        <Empty title="No portfolio has been submitted yet" />
      </Section>
    </Page>
  );
}
