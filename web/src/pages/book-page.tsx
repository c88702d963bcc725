import { Page } from '../components/page.tsx';
import { Skeleton } from '../components/skeleton.tsx';

/** The Book of a building. */
export function BookPage() {
  return (
    <Page title="The Book">
      <Skeleton label="Opening the Book" />
    </Page>
  );
}
