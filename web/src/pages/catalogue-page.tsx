import { useQuery } from '@tanstack/react-query';
import { useDeferredValue } from 'react';
import { useSearchParams } from 'react-router-dom';
import { Page } from '../components/page.tsx';
import { Tabs } from '../components/tabs.tsx';
import { TextField } from '../components/text-field.tsx';
import { kindsQuery } from '../features/catalogue/api/kinds.ts';
import { materialsQuery } from '../features/catalogue/api/materials.ts';
import { CatalogueList } from '../features/catalogue/catalogue-list.tsx';
import { KindsTable } from '../features/catalogue/kinds-table.tsx';
import { MaterialsTable } from '../features/catalogue/materials-table.tsx';
import { readSort, writeSort } from '../lib/sort-in-url.ts';

export function CataloguePage() {
  const [url, setUrl] = useSearchParams();
  const typed = url.get('find') ?? '';
  const asked = useDeferredValue(typed);
  const list = url.get('list') === 'kinds' ? 'kinds' : 'materials';
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
  const find = (text: string) => {
    write((next) => {
      if (text === '') next.delete('find');
      else next.set('find', text);
    });
  };
  const sorting = {
    sort: readSort(url),
    onSort: (sort: NonNullable<ReturnType<typeof readSort>>) => {
      write((next) => {
        writeSort(next, sort);
      });
    },
  };
  const narrowing = { typed: asked, onShowAll: () => find('') };
  return (
    <Page title="Catalogue" lead="What burns, with its heat and where each figure comes from.">
      <div className="mb-6 max-w-96">
        <TextField
          label="Find a material or kind"
          hint="The beginning of any word: a name, a group, a hazard."
          type="search"
          value={typed}
          onChange={find}
        />
      </div>
      <Tabs
        label="Lists of the catalogue"
        chosen={list}
        onChoose={(id) => {
          write((next) => {
            next.delete('sort');
            if (id === 'kinds') next.set('list', id);
            else next.delete('list');
          });
        }}
        tabs={[
          {
            id: 'materials',
            label: 'Materials',
            content: (
              <CatalogueList noun="materials" rows={materials} {...narrowing}>
                {(found) => <MaterialsTable materials={found} {...sorting} />}
              </CatalogueList>
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
