import type { Limit } from '@embertally/shared/contracts/limits';
import type { Survey } from '@embertally/shared/contracts/surveys';
import type { ChangeSetBody } from '@embertally/shared/survey/change';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { toView } from '@embertally/web/src/book/interaction/camera.ts';
import { PlanHost, type HostPointer } from '@embertally/web/src/book/interaction/plan-host.ts';
import { BookSession } from '@embertally/web/src/book/session/book-session.ts';
import { uid } from '../../support/survey-builder.ts';

export const NOW = '2026-03-02T14:32:00.000Z';

export function surveySample(more: Partial<Survey> = {}): Survey {
  return {
    id: uid('survey'),
    kind: 'working',
    sequence: 0,
    building: { id: uid('building'), name: 'Main building' },
    site: { id: uid('site'), name: 'Saltmarsh Lane Store', time_zone: 'Europe/London' },
    my_role: 'inspector',
    of_keeper: false,
    ...more,
  };
}

export interface OpenedBook {
  readonly session: BookSession;
  readonly queued: ChangeSetBody[];
}

/** A session over a document, with ids that count up and everything it wants saved in a list. */
export function openedBook(
  document: SurveyDocument,
  more: { readonly canEdit?: boolean; readonly limits?: readonly Limit[] } = {},
): OpenedBook {
  const queued: ChangeSetBody[] = [];
  let made = 0;
  const session = new BookSession(
    {
      survey: surveySample(),
      document,
      limits: more.limits ?? [],
      units: 'SI',
      canEdit: more.canEdit ?? true,
      person: 'Ines Okoro',
    },
    {
      newId: () => uid(`made ${(made += 1)}`),
      now: () => NOW,
      queue: (set) => queued.push(set),
      keepSteps: () => undefined,
    },
  );
  session.setView(800, 600);
  session.setCamera({ x_m: 8, y_m: 6, pxPerM: 50 });
  return { session, queued };
}

type Held = Partial<Pick<HostPointer, 'shift' | 'free' | 'type' | 'id' | 'pans' | 'primary'>>;

/** A hand on the plan: says where in metres, and the host hears pixels. */
export class PlanDriver {
  readonly session: BookSession;
  readonly queued: ChangeSetBody[];
  readonly host: PlanHost;

  constructor(document: SurveyDocument, more: Parameters<typeof openedBook>[1] = {}) {
    const { session, queued } = openedBook(document, more);
    this.session = session;
    this.queued = queued;
    this.host = new PlanHost(session);
  }

  get document(): SurveyDocument {
    return this.session.state.document;
  }

  /** What a person sees of a gesture in progress. */
  get preview() {
    return this.host.preview.get();
  }

  down(x_m: number, y_m: number, held: Held = {}): void {
    this.host.press(this.#pointer(x_m, y_m, held));
  }

  move(x_m: number, y_m: number, held: Held = {}): void {
    this.host.move(this.#pointer(x_m, y_m, held));
  }

  up(x_m: number, y_m: number, held: Held = {}): void {
    this.host.lift(this.#pointer(x_m, y_m, held));
  }

  press(x_m: number, y_m: number, held: Held = {}): void {
    this.move(x_m, y_m, held);
    this.down(x_m, y_m, held);
    this.up(x_m, y_m, held);
  }

  drag(from: readonly [number, number], to: readonly [number, number], held: Held = {}): void {
    this.down(...from, held);
    this.move((from[0] + to[0]) / 2, (from[1] + to[1]) / 2, held);
    this.move(...to, held);
    this.up(...to, held);
  }

  keys(...keys: string[]): void {
    for (const key of keys) this.host.key({ key, shift: false, alt: false });
  }

  type(text: string): void {
    this.keys(...text);
  }

  #pointer(x_m: number, y_m: number, held: Held): HostPointer {
    const { camera, view } = this.session.state;
    return {
      id: 1,
      type: 'mouse',
      shift: false,
      free: false,
      pans: false,
      primary: (held.id ?? 1) === 1,
      ...held,
      at: toView(camera, view, { x_m, y_m }),
    };
  }
}
