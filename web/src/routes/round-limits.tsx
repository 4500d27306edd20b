import { Empty } from '../ui/empty';
import { Page, PageHeader } from '../ui/page';
import { Section } from '../ui/section';

export function Component() {
  return (
    <Page>
      <PageHeader title="Limits" />
      <Section>
        <Empty title="No limit is set yet" />
      </Section>
    </Page>
  );
}
