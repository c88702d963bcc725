import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Page } from '../components/page.tsx';
import { createSite } from '../features/sites/api/create-site.ts';
import { SiteForm } from '../features/sites/site-form.tsx';
import { deviceTimeZone } from '../features/sites/time-zones.ts';
import { paths } from '../lib/paths.ts';

const TRAIL = [{ label: 'Sites', to: paths.sites() }];

export function NewSitePage() {
  const client = useQueryClient();
  const navigate = useNavigate();
  const [id] = useState(() => crypto.randomUUID());
  return (
    <Page title="New site" lead="You become its manager; buildings and people come next." trail={TRAIL}>
      <SiteForm
        name="new-site"
        initial={{ name: '', address: '', time_zone: deviceTimeZone() }}
        verb="Make the site"
        onSend={async (values) => {
          const site = await createSite(client, { id, ...values });
          await navigate(paths.site(site.id), { replace: true });
        }}
      />
    </Page>
  );
}
