import { canOnSite } from '@embertally/shared/policy/policy';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate, useParams } from 'react-router-dom';
import { Button } from '../components/button.tsx';
import { Disclosure } from '../components/disclosure.tsx';
import { EmptyState } from '../components/empty-state.tsx';
import { LinkButton } from '../components/link-button.tsx';
import { LoadFailed } from '../components/load-failed.tsx';
import { Page } from '../components/page.tsx';
import { Part } from '../components/part.tsx';
import { Skeleton } from '../components/skeleton.tsx';
import { BuildingLimits } from '../features/limits/building-limits.tsx';
import { siteQuery } from '../features/sites/api/site.ts';
import { BuildingList } from '../features/sites/building-list.tsx';
import { EditSiteDialog } from '../features/sites/edit-site-dialog.tsx';
import { GiveRoleForm } from '../features/sites/give-role-form.tsx';
import { HistoryList } from '../features/sites/history-list.tsx';
import { NewBuildingDialog } from '../features/sites/new-building-dialog.tsx';
import { PeopleList } from '../features/sites/people-list.tsx';
import { NotFoundError } from '../lib/api-errors.ts';
import { paths } from '../lib/paths.ts';

const TRAIL = [{ label: 'Sites', to: paths.sites() }];

export function SitePage() {
  const { siteId = '' } = useParams();
  const navigate = useNavigate();
  const site = useQuery(siteQuery(siteId));
  const [making, setMaking] = useState(false);
  const [editing, setEditing] = useState(false);

  if (site.isPending) {
    return (
      <Page title="Site" trail={TRAIL} right={<Skeleton label="Reading who is here" lines={4} />}>
        <Skeleton label="Reading the site" />
      </Page>
    );
  }
  if (site.isError) {
    const gone = site.error instanceof NotFoundError;
    return (
      <Page title={gone ? 'There is no such site' : 'Site'} trail={TRAIL}>
        {gone ? (
          <EmptyState
            title="Nothing to show"
            action={
              <LinkButton look="primary" to={paths.sites()}>
                Go to your sites
              </LinkButton>
            }
          >
            The address may be mistyped, or you have no role on this site. Its manager can give you one.
          </EmptyState>
        ) : (
          <LoadFailed
            what="The site"
            error={site.error}
            retrying={site.isFetching}
            onRetry={() => void site.refetch()}
          />
        )}
      </Page>
    );
  }

  const { data } = site;
  const standing = { role: data.my_role, ofKeeper: data.of_keeper };
  const mayBuild = canOnSite(standing, 'building.create');
  const mayGive = canOnSite(standing, 'site-role.give');
  const newBuilding = (
    <Button
      look={data.building_list.length === 0 ? 'primary' : 'secondary'}
      size={data.building_list.length === 0 ? 'normal' : 'small'}
      onClick={() => setMaking(true)}
    >
      New building
    </Button>
  );
  return (
    <Page
      title={data.name}
      lead={
        <>
          {data.address === '' ? null : <span className="block">{data.address}</span>}
          Kept by {data.keeper.name} · you are {data.my_role} here
        </>
      }
      trail={TRAIL}
      actions={
        canOnSite(standing, 'site.edit') ? (
          <Button size="small" onClick={() => setEditing(true)}>
            Edit site
          </Button>
        ) : undefined
      }
      right={
        <>
          <Part title="People">
            <PeopleList siteId={data.id} people={data.people} mayTake={mayGive} />
            {mayGive ? (
              <Disclosure title="Give a person a role">
                <GiveRoleForm siteId={data.id} />
              </Disclosure>
            ) : null}
          </Part>
          {canOnSite(standing, 'history.read') ? (
            <Part title="History">
              <HistoryList siteId={data.id} timeZone={data.time_zone} people={data.people} />
            </Part>
          ) : null}
        </>
      }
    >
      <Part title="Buildings" action={mayBuild && data.building_list.length > 0 ? newBuilding : undefined}>
        {data.building_list.length === 0 ? (
          <div className="pt-4">
            <EmptyState title="No building yet" action={mayBuild ? newBuilding : undefined}>
              {mayBuild
                ? 'A building has one Book: its storeys, rooms and what burns in them. Make the first one.'
                : 'A building has one Book. A manager or an inspector of this site can make the first one.'}
            </EmptyState>
          </div>
        ) : (
          <BuildingList buildings={data.building_list} />
        )}
      </Part>
      {data.building_list.length === 0 ? null : (
        <Part title="Limits">
          {data.building_list.map((building) => (
            <div key={building.id}>
              {data.building_list.length > 1 ? <h3 className="pt-4 font-bold">{building.name}</h3> : null}
              <BuildingLimits buildingId={building.id} buildingName={building.name} surveyId={building.survey_id} />
            </div>
          ))}
        </Part>
      )}
      <NewBuildingDialog
        siteId={data.id}
        open={making}
        onClose={() => setMaking(false)}
        onMade={(building) => void navigate(paths.survey(building.survey_id))}
      />
      <EditSiteDialog site={data} open={editing} onClose={() => setEditing(false)} />
    </Page>
  );
}
