import type { Site } from '@embertally/shared/contracts/sites';
import { useQueryClient } from '@tanstack/react-query';
import { Dialog } from '../../components/dialog.tsx';
import { useStatus } from '../../components/status-region.tsx';
import { StaleError } from '../../lib/api-errors.ts';
import { ToldError } from '../../lib/told-error.ts';
import { editSite } from './api/edit-site.ts';
import { siteQuery } from './api/site.ts';
import { SiteForm } from './site-form.tsx';

interface EditSiteDialogProps {
  readonly site: Site;
  readonly open: boolean;
  readonly onClose: () => void;
}

/** Changes a site's name, address or time zone. */
export function EditSiteDialog({ site, open, onClose }: EditSiteDialogProps) {
  const client = useQueryClient();
  const announce = useStatus();
  return (
    <Dialog open={open} onClose={onClose} title="Edit site">
      <SiteForm
        name={`edit-site-${site.id}`}
        initial={{ name: site.name, address: site.address, time_zone: site.time_zone }}
        verb="Save"
        onSend={async (values) => {
          try {
            await editSite(client, site, values);
          } catch (error) {
            if (!(error instanceof StaleError)) throw error;
            await client.invalidateQueries({ queryKey: siteQuery(site.id).queryKey });
            throw new ToldError(
              'Somebody changed this site while you were typing. What you typed is kept: look at it once more and save again.',
              { cause: error },
            );
          }
          onClose();
          announce('The site was changed.');
        }}
      />
    </Dialog>
  );
}
