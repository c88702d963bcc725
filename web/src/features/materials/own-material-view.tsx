import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { ChartFigure } from '../../components/chart/chart-figure.tsx';
import { LoadFailed } from '../../components/load-failed.tsx';
import { Page } from '../../components/page.tsx';
import { Part } from '../../components/part.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import type { TrailStep } from '../../components/trail.tsx';
import { WarningList } from '../../components/working/warning-list.tsx';
import type { CatalogueMaterial } from '../../lib/catalogue-materials.ts';
import { useUnits } from '../../lib/units-context.ts';
import { materialVersionQuery, type OwnMaterialVersion } from './api/material-version.ts';
import type { OwnMaterial } from './api/own-material.ts';
import { BasisNotice } from './basis-notice.tsx';
import { curveChartOf } from './curve-chart-of.ts';
import { EvidenceList } from './evidence-list.tsx';
import { HeatFigures } from './heat-figures.tsx';
import { StatedFacts } from './stated-facts.tsx';
import { StateMark } from './state-mark.tsx';
import { VersionActions } from './version-actions.tsx';
import { VersionsTable } from './versions-table.tsx';
import { isWay, WAY_WORDS } from './way-words.ts';
import { WorkingList } from './working-list.tsx';

interface OwnMaterialViewProps {
  readonly material: OwnMaterial;
  readonly version: number;
  readonly materials: readonly CatalogueMaterial[];
  readonly trail: readonly TrailStep[];
}

/** A material of the organisation's own: one version of it with its workings, and every other one beside it. */
export function OwnMaterialView({ material, version, materials, trail }: OwnMaterialViewProps) {
  const read = useQuery(materialVersionQuery(material.id, version));
  const summary = material.versions.find((one) => one.version === version);
  const versions = (
    <Part title="Versions">
      <VersionsTable material={material} shown={version} />
    </Part>
  );
  return (
    <Page
      title={summary?.label ?? material.label}
      lead={
        summary === undefined ? undefined : (
          <span className="flex flex-wrap items-baseline gap-x-3 gap-y-1">
            <span>Own material, version {version}</span>
            <StateMark state={summary.state} />
            <span>{isWay(summary.way) ? WAY_WORDS[summary.way].title : summary.way}</span>
          </span>
        )
      }
      trail={trail}
      right={
        <>
          {read.isSuccess ? (
            <Part title="What can be done">
              <VersionActions
                key={`${read.data.tag} ${read.data.state}`}
                version={read.data}
                inForce={material.in_force === version}
              />
            </Part>
          ) : null}
          {versions}
          {read.isSuccess ? (
            <Part title="Evidence">
              <EvidenceList files={read.data.evidence} />
            </Part>
          ) : null}
        </>
      }
    >
      {read.isPending ? <Skeleton label="Reading this version" /> : null}
      {read.isError ? (
        <LoadFailed
          what="This version"
          error={read.error}
          retrying={read.isFetching}
          onRetry={() => void read.refetch()}
        />
      ) : null}
      {read.isSuccess ? <VersionFigures version={read.data} materials={materials} /> : null}
    </Page>
  );
}

interface VersionFiguresProps {
  readonly version: OwnMaterialVersion;
  readonly materials: readonly CatalogueMaterial[];
}

function VersionFigures({ version, materials }: VersionFiguresProps) {
  const units = useUnits();
  const { derived, draft, label } = version;
  const chart = useMemo(
    () => (derived.curve === null ? null : curveChartOf(derived.curve, label, units)),
    [derived.curve, label, units],
  );
  return (
    <>
      <Part title="Heat">
        <div className="grid gap-4 pt-4">
          <div>
            <HeatFigures derived={derived} />
          </div>
          {derived.basis === null ? null : <BasisNotice basis={derived.basis} />}
          <WarningList warnings={derived.warnings.filter(({ text }) => text !== derived.basis?.text)} />
        </div>
      </Part>
      {chart === null ? null : (
        <Part title="How it burnt when it was measured">
          <div className="pt-4">
            <ChartFigure chart={chart} />
          </div>
        </Part>
      )}
      <Part title="How it was worked out">
        <WorkingList workings={derived.workings} />
      </Part>
      <Part title="What was stated">
        <StatedFacts draft={draft} nameOf={(key) => materials.find((row) => row.key === key)?.label ?? key} />
      </Part>
    </>
  );
}
