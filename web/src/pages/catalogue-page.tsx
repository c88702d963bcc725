import { versionStateSchema, type VersionState } from '@embertally/shared/contracts/own-materials';
import { useQuery } from '@tanstack/react-query';
import { useDeferredValue } from 'react';
import { useSearchParams } from 'react-router-dom';
import { LinkButton } from '../components/link-button.tsx';
import { Page } from '../components/page.tsx';
import { SelectField } from '../components/select-field.tsx';
import { Tabs } from '../components/tabs.tsx';
import { TextField } from '../components/text-field.tsx';
import { kindsQuery } from '../features/catalogue/api/kinds.ts';
import { materialsQuery } from '../lib/catalogue-materials.ts';
import { CatalogueList } from '../features/catalogue/catalogue-list.tsx';
import { KindsTable } from '../features/catalogue/kinds-table.tsx';
import { MaterialsTable } from '../features/catalogue/materials-table.tsx';
import { OwnMaterialsList } from '../features/materials/own-materials-list.tsx';
import { paths } from '../lib/paths.ts';
import { readSort, writeSort } from '../lib/sort-in-url.ts';

function listOf(text: string | null): 'materials' | 'own' | 'kinds' {
  return text === 'kinds' || text === 'own' ? text : 'materials';
}

function stateOf(text: string | null): VersionState | null {
  const read = versionStateSchema.safeParse(text);
  return read.success ? read.data : null;
}

export function CataloguePage() {
  const [url, setUrl] = useSearchParams();
  const typed = url.get('find') ?? '';
  const asked = useDeferredValue(typed);
  const list = listOf(url.get('list'));
  const group = url.get('group') ?? '';
  const state = stateOf(url.get('state'));
  const materials = useQuery(materialsQuery());
  const kinds = useQuery({ ...kindsQuery(), enabled: list === 'kinds' });
  const write = (change: (next: URLSearchParams) => void) => {
    setUrl(
      (current) => {
        const next = new URLSearchParams(current);
        change(next);
        return next;
      },
      { replace: true },
    );
  };
  const sorting = {
    sort: readSort(url),
    onSort: (sort: NonNullable<ReturnType<typeof readSort>>) => {
      write((next) => {
        writeSort(next, sort);
      });
    },
  };
  const set = (name: string, value: string | null) => {
    write((next) => {
      if (value === null || value === '') next.delete(name);
      else next.set(name, value);
    });
  };
  const groups = [...new Set(materials.data?.items.map((row) => row.group))];
  const narrowing = { typed: asked, onShowAll: () => set('find', null) };
  return (
    <Page
      title="Catalogue"
      lead="What burns, with its heat and where each figure comes from."
      actions={<LinkButton to={paths.newMaterial()}>Add a material</LinkButton>}
    >
      <div className="mb-6 max-w-96">
        <TextField
          label="Find a material or kind"
          hint="The beginning of any word: a name, a group, a hazard."
          type="search"
          value={typed}
          onChange={(text) => set('find', text)}
        />
      </div>
      <Tabs
        label="Lists of the catalogue"
        chosen={list}
        onChoose={(id) => {
          write((next) => {
            next.delete('sort');
            if (id === 'materials') next.delete('list');
            else next.set('list', id);
          });
        }}
        tabs={[
          {
            id: 'materials',
            label: 'Materials',
            content: (
              <>
                {groups.length < 2 ? null : (
                  <div className="mb-4">
                    <SelectField
                      label="Group"
                      width="medium"
                      value={groups.includes(group) ? group : ''}
                      options={[
                        { value: '', label: 'Every group' },
                        ...groups.map((name) => ({ value: name, label: name.charAt(0).toUpperCase() + name.slice(1) })),
                      ]}
                      onChange={(value) => set('group', value)}
                    />
                  </div>
                )}
                <CatalogueList
                  noun="materials"
                  rows={materials}
                  only={groups.includes(group) ? (row) => row.group === group : undefined}
                  {...narrowing}
                >
                  {(found) => <MaterialsTable materials={found} {...sorting} />}
                </CatalogueList>
              </>
            ),
          },
          {
            id: 'own',
            label: 'Your own',
            content:
              list !== 'own' ? null : (
                <OwnMaterialsList
                  typed={asked}
                  state={state}
                  onState={(value) => set('state', value)}
                  onShowAll={() => {
                    write((next) => {
                      next.delete('find');
                      next.delete('state');
                    });
                  }}
                />
              ),
          },
          {
            id: 'kinds',
            label: 'Kinds',
            content: (
              <CatalogueList noun="kinds" rows={kinds} {...narrowing}>
                {(found) => <KindsTable kinds={found} {...sorting} />}
              </CatalogueList>
            ),
          },
        ]}
      />
    </Page>
  );
}
