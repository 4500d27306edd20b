import { Page } from './page';
import { Skeleton } from './skeleton';

/** While the first page is on its way. */
export function Loading() {
  return (
    <Page>
      <Skeleton rows={10} />
    </Page>
  );
}
