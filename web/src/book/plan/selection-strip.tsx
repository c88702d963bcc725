import { footprint } from '@embertally/shared/geometry/footprint';
import type { Point } from '@embertally/shared/geometry/point';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { useLayoutEffect, useRef, useSyncExternalStore } from 'react';
import { toView } from '../interaction/camera.ts';
import type { PlanHost } from '../interaction/plan-host.ts';
import { sceneOf, type Scene } from '../interaction/scene.ts';
import type { Selected, ToolName } from '../session/book-state.ts';
import { useBook } from '../session/use-book.ts';
import { deletePicked } from '../actions/delete-picked.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { EntryStrip } from './entry-strip.tsx';
import { ManyStrip } from './many-strip.tsx';
import { OpeningStrip } from './opening-strip.tsx';
import { placeStrip } from './place-strip.ts';
import { RoomStrip } from './room-strip.tsx';
import { StripVerb } from './strip-verb.tsx';
import { WallStrip } from './wall-strip.tsx';

/** While one of these is in hand a press on the plan draws, and nothing may lie in its way. */
const DRAWING: ReadonlySet<ToolName> = new Set(['draw-room', 'measure', 'split-room']);

/** A short strip of fields beside what is picked, on the plan. On a narrow screen it lies along the foot of the plan. */
export function SelectionStrip({ host }: { readonly host: PlanHost }) {
  const session = useBookSession();
  const strip = useRef<HTMLDivElement>(null);
  const document = useBook((state) => state.document);
  const storeyId = useBook((state) => state.storeyId);
  const selection = useBook((state) => state.selection);
  const canEdit = useBook((state) => state.canEdit);
  const camera = useBook((state) => state.camera);
  const view = useBook((state) => state.view);
  const drawing = useBook((state) => DRAWING.has(state.tool));
  const busy = useSyncExternalStore(host.preview.subscribe, () => {
    const preview = host.preview.get();
    return preview.entries !== undefined || preview.changes !== undefined || preview.marquee !== undefined;
  });
  const scene = storeyId === null ? null : sceneOf(document, storeyId);
  const [only] = selection;
  const shown = canEdit && !busy && !drawing && scene !== null && only !== undefined && storeyId !== null;

  useLayoutEffect(() => {
    const element = strip.current;
    if (element === null || scene === null) return;
    const points = selection.flatMap((picked) => pointsOf(picked, document, scene));
    const place = placeStrip(
      points.map((point) => toView(camera, view, point)),
      { width: element.offsetWidth, height: element.offsetHeight },
      view,
    );
    element.style.setProperty('--strip-left', `${place.left}px`);
    element.style.setProperty('--strip-top', `${place.top}px`);
  });

  if (!shown) return null;
  const body = () => {
    if (selection.length > 1) {
      const entryIds = selection.flatMap(({ kind, id }) => (kind === 'entry' ? [id] : []));
      return entryIds.length === 0 ? null : <ManyStrip ids={entryIds} />;
    }
    switch (only.kind) {
      case 'entry': {
        const entry = document.entries.get(only.id);
        return entry === undefined ? null : <EntryStrip key={entry.id} entry={entry} />;
      }
      case 'opening': {
        const opening = document.openings.get(only.id);
        return opening === undefined ? null : <OpeningStrip key={opening.id} opening={opening} />;
      }
      case 'room': {
        const room = document.rooms.get(only.id);
        return room === undefined ? null : <RoomStrip key={room.id} room={room} />;
      }
      case 'wall': {
        const wall = scene.walls.find(({ id }) => id === only.id);
        return wall === undefined ? null : <WallStrip wall={wall} storeyId={storeyId} />;
      }
      case 'corner':
        return (
          <>
            <p className="strip-name">Corner</p>
            <StripVerb
              label="Remove"
              onPress={() => {
                deletePicked(session);
              }}
            />
          </>
        );
    }
  };
  const content = body();
  if (content === null) return null;
  return (
    <div ref={strip} className="strip" role="group" tabIndex={-1} aria-label="What is picked">
      {content}
    </div>
  );
}

function pointsOf(picked: Selected, document: SurveyDocument, scene: Scene): readonly Point[] {
  switch (picked.kind) {
    case 'entry': {
      const entry = document.entries.get(picked.id);
      return entry === undefined ? [] : footprint(entry);
    }
    case 'opening': {
      const shape = scene.openings.find(({ opening }) => opening.id === picked.id);
      return shape === undefined ? [] : [shape.a, shape.b];
    }
    case 'room':
      return scene.rooms.find(({ room }) => room.id === picked.id)?.ring ?? [];
    case 'wall': {
      const wall = scene.walls.find(({ id }) => id === picked.id);
      return wall === undefined ? [] : [wall.a, wall.b];
    }
    case 'corner': {
      const corner = document.corners.get(picked.id);
      return corner === undefined ? [] : [corner];
    }
  }
}
