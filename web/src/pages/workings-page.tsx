import { Page } from '../components/page.tsx';
import { Skeleton } from '../components/skeleton.tsx';

/** Every working of one room. */
export function WorkingsPage() {
  return (
    <Page title="Workings">
      <Skeleton label="Reading the workings" />
    </Page>
  );
}
