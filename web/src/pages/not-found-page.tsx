import { LinkButton } from '../components/link-button.tsx';
import { Page } from '../components/page.tsx';
import { paths } from '../lib/paths.ts';

/** An address that leads nowhere. */
export function NotFoundPage() {
  return (
    <Page title="There is no such page" lead="The address may be mistyped, or the page has moved. Nothing is lost.">
      <LinkButton look="primary" to={paths.today()}>
        Go to Today
      </LinkButton>
    </Page>
  );
}
