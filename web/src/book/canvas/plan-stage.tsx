import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { lazy, Suspense, useMemo, useSyncExternalStore } from 'react';
import type { Stage } from 'konva/lib/Stage';
import type { PlanHost } from '../interaction/plan-host.ts';
import { useBook } from '../session/use-book.ts';
import { useSpreadPlay } from '../spread/use-spread-play.ts';
import { paintCrosshair } from './paint-crosshair.ts';
import { paintFurniture } from './paint-furniture.ts';
import { paintGrid } from './paint-grid.ts';
import { paintPreview } from './paint-preview.ts';
import { paintSelection } from './paint-selection.ts';
import { Painting } from './painting.tsx';
import type { Palette } from './palette.ts';
import { PlanLayer } from './plan-layer.tsx';
import { RoomPlates } from './room-plates.ts';
import { useFontsReady } from './use-fonts-ready.ts';
import { usePalette } from './use-palette.ts';
import { useStage } from './use-stage.ts';

const SpreadLayer = lazy(async () => ({ default: (await import('./spread-layer.tsx')).SpreadLayer }));

const FOOT_M = 0.3048;

/** The plan as a picture: four layers, drawn and never asked, and a fifth while a fire is shown. */
export function PlanStage({ host }: { readonly host: PlanHost }) {
  const view = useBook((state) => state.view);
  const palette = usePalette();
  const { stage, mount } = useStage(view);
  const showsFire = useSpreadPlay((state) => state.fire !== null || state.gap !== null);
  const fontsReady = useFontsReady();
  // What was measured with another font is forgotten with its plates.
  const plates = useMemo(() => new RoomPlates(fontsReady), [fontsReady]);
  return (
    <div ref={mount}>
      {stage === null ? null : (
        <>
          <Backdrop stage={stage} palette={palette} />
          <PlanLayer stage={stage} host={host} palette={palette} plates={plates} />
          <Active stage={stage} host={host} palette={palette} plates={plates} />
          <Overlay stage={stage} palette={palette} />
          {showsFire ? (
            <Suspense fallback={null}>
              <SpreadLayer stage={stage} palette={palette} />
            </Suspense>
          ) : null}
        </>
      )}
    </div>
  );
}

interface LayerProps {
  readonly stage: Stage;
  readonly palette: Palette;
}

function Backdrop({ stage, palette }: LayerProps) {
  const camera = useBook((state) => state.camera);
  const view = useBook((state) => state.view);
  return <Painting stage={stage} camera={camera} view={view} palette={palette} paint={paintGrid} />;
}

/** What is picked and what a gesture would do. */
function Active({
  stage,
  host,
  palette,
  plates,
}: LayerProps & { readonly host: PlanHost; readonly plates: RoomPlates }) {
  const camera = useBook((state) => state.camera);
  const view = useBook((state) => state.view);
  const document = useBook((state) => state.document);
  const storeyId = useBook((state) => state.storeyId);
  const selection = useBook((state) => state.selection);
  const canEdit = useBook((state) => state.canEdit);
  const roomInHand = useBook((state) => state.roomInHand);
  const units = useBook((state) => state.units);
  const preview = useSyncExternalStore(host.preview.subscribe, host.preview.get);
  const crosshair = useSyncExternalStore(host.crosshair.subscribe, host.crosshair.get);
  const wallThickness_m = (storeyId === null ? null : document.storeys.get(storeyId)?.wall_thickness_m) ?? 0;
  const lengthText = (length_m: number) => {
    const step_m = units === 'US' ? FOOT_M / 100 : 0.001;
    const { text, unit } = formatQuantity(Math.round(length_m / step_m) * step_m, 'm', units, {
      figures: 'as entered',
    });
    return `${text} ${unit}`;
  };
  // While things are being moved the handles would only be in the way.
  const busy = preview.entries !== undefined || preview.changes !== undefined;
  return (
    <Painting
      stage={stage}
      camera={camera}
      view={view}
      palette={palette}
      paint={(pen) => {
        if (storeyId !== null && !busy)
          paintSelection(pen, { document, storeyId, selection, lengthText, canEdit, roomInHand, plates: plates.shown });
        paintPreview(pen, preview, { wallThickness_m, lengthText });
        if (crosshair !== null) paintCrosshair(pen, crosshair);
      }}
    />
  );
}

/** Scale bar and north stand still over the plan. */
function Overlay({ stage, palette }: LayerProps) {
  const camera = useBook((state) => state.camera);
  const view = useBook((state) => state.view);
  const units = useBook((state) => state.units);
  const north = useBook((state) => state.document.storeys.get(state.storeyId ?? '')?.north_deg ?? null);
  return (
    <Painting
      stage={stage}
      camera={camera}
      view={view}
      palette={palette}
      paint={(pen) => {
        paintFurniture(pen, north, units === 'US' ? { unit: 'ft', unit_m: FOOT_M } : { unit: 'm', unit_m: 1 });
      }}
    />
  );
}
