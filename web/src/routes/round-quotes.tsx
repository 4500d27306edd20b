import { Empty } from '../ui/empty';
import { Page, PageHeader } from '../ui/page';
import { Section } from '../ui/section';

export function Component() {
  return (
    <Page>
      <PageHeader title="Quotes" />
      <Section>
        <Empty title="No quote has come in yet" />
      </Section>
    </Page>
  );
}
