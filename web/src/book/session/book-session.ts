import type { PlaceableMaterial } from '@embertally/shared/catalogue/placeable-material';
import { roomsInReadingOrder } from '@embertally/shared/survey/derive/rooms-in-reading-order';
import type { Limit } from '@embertally/shared/contracts/limits';
import type { Survey } from '@embertally/shared/contracts/surveys';
import { applyChanges } from '@embertally/shared/survey/apply-changes';
import type { ChangeSetBody, Changes } from '@embertally/shared/survey/change';
import type { Command, Done, Refusal } from '@embertally/shared/survey/command';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import type { BookMessage, BookPageName, BookState, Camera, Placing, Selected, ToolName, Units } from './book-state.ts';
import { createHistory, type History, type Step } from './history.ts';
import { roomTallyMemo, type RoomTallyMemo } from './room-tally-memo.ts';
import { NOTHING_TO_SAVE, type SavingStatus } from './saving-status.ts';

/** The outside world the session needs. */
export interface BookSessionPorts {
  readonly newId: () => string;
  /** ISO instant. */
  readonly now: () => string;
  /** Called once per gesture with what is to be saved; the session never waits for it. */
  readonly queue: (set: ChangeSetBody) => void;
  /** Called with the own steps that can be taken back, oldest first, whenever they change. */
  readonly keepSteps: (steps: readonly Step[]) => void;
}

export interface BookSessionStart {
  readonly survey: Survey;
  readonly document: SurveyDocument;
  readonly limits: readonly Limit[];
  readonly units: Units;
  readonly canEdit: boolean;
  /** Name of the person who edits, written into `recorded_by`. */
  readonly person: string;
}

export interface RunOptions {
  /** `returned`: the caller shows the refusal at its field; otherwise it stands on the plan. */
  readonly refusal?: 'shown' | 'returned';
}

/**
 * One open survey: the document as this person sees it, what is picked, and the way back. Framework-free; React reads it
 * through `useBook`. Writes go through `run`, which applies at once and queues the change set for the server.
 */
export class BookSession {
  #state: BookState;
  readonly #readers = new Set<() => void>();
  readonly #ports: BookSessionPorts;
  readonly #history: History = createHistory();
  readonly #tallies: RoomTallyMemo = roomTallyMemo();
  readonly person: string;

  constructor(start: BookSessionStart, ports: BookSessionPorts) {
    this.#ports = ports;
    this.person = start.person;
    const storeyId = groundStorey(start.document);
    this.#state = {
      survey: start.survey,
      document: start.document,
      limits: start.limits,
      units: start.units,
      canEdit: start.canEdit,
      storeyId,
      roomInHand: firstRoom(start.document, storeyId),
      selection: [],
      page: 'plan',
      tables: false,
      tool: 'select',
      placing: { entry: null, openingKind: 'door' },
      camera: { x_m: 6, y_m: 4, pxPerM: 50 },
      view: { width: 0, height: 0 },
      message: null,
      announcement: { text: '', count: 0 },
      clipboard: [],
      canUndo: null,
      canRedo: null,
      saving: NOTHING_TO_SAVE,
      engineReady: false,
      ownMaterials: [],
    };
  }

  get state(): BookState {
    return this.#state;
  }

  readonly subscribe = (reader: () => void): (() => void) => {
    this.#readers.add(reader);
    return () => this.#readers.delete(reader);
  };

  readonly newId = (): string => this.#ports.newId();
  readonly now = (): string => this.#ports.now();

  /**
   * Does one gesture: applies the command's changes, remembers them as one undo step and queues them for the server.
   * @param label What the gesture was, in the past tense: "Drew a room".
   */
  run<Input>(command: Command<Input>, input: Input, label: string, options: RunOptions = {}): Done | Refusal {
    if (!this.#state.canEdit) return this.#refuse(READ_ONLY, options);
    const result = command(this.#state.document, input);
    if (result.refused) return this.#refuse(result, options);
    if (result.changes.length === 0) return result;
    this.#history.push({ label, changes: result.changes, selection: this.#state.selection });
    this.#commit(result.changes, label);
    this.#ports.keepSteps(this.#history.steps());
    this.announce(label);
    return result;
  }

  /** Takes back the last own step. Fields somebody else has changed since stay as they are and are named. */
  undo(): void {
    this.#step('undo');
  }

  redo(): void {
    this.#step('redo');
  }

  /** Changes of other people, or of this person's other tab: applied without an undo step. */
  receive(document: SurveyDocument): void {
    this.#set({ document });
  }

  /** After "take theirs" the way back would undo what others did, so it is closed and the interface says so. */
  forgetHistory(): void {
    this.#history.clear();
    this.#ports.keepSteps([]);
    this.#set({});
  }

  /** The way back as it was kept on the device before the page was loaded again. */
  restoreSteps(steps: readonly Step[]): void {
    this.#history.restore(steps);
    this.#set({});
  }

  setLimits(limits: readonly Limit[]): void {
    this.#set({ limits });
  }

  setUnits(units: Units): void {
    this.#set({ units });
  }

  setSaving(saving: SavingStatus): void {
    this.#set({ saving });
  }

  /** Picks things on the plan. Picking a room, or something in one, takes that room in hand. */
  select(selection: readonly Selected[]): void {
    const room = this.#roomOf(selection[0]);
    this.#set({ selection, roomInHand: room ?? this.#state.roomInHand, message: null });
  }

  /** Reads another room's tally; goes to its storey and picks it. */
  takeRoom(roomId: string): void {
    const room = this.#state.document.rooms.get(roomId);
    if (room === undefined) return;
    this.#set({
      roomInHand: roomId,
      storeyId: room.storey_id,
      selection: [{ kind: 'room', id: roomId }],
      message: null,
    });
  }

  goToStorey(storeyId: string): void {
    if (!this.#state.document.storeys.has(storeyId)) return;
    const roomInHand = firstRoom(this.#state.document, storeyId);
    this.#set({ storeyId, roomInHand, selection: [], message: null });
  }

  setTool(tool: ToolName, placing: Partial<Placing> = {}): void {
    // What was picked is let go when another tool is taken up: its strip of fields would lie over the floor to work on.
    const selection = tool === 'select' || tool === this.#state.tool ? this.#state.selection : [];
    this.#set({ tool, selection, placing: { ...this.#state.placing, ...placing }, message: null });
  }

  /** Turns to a page; on a wide screen plan and tally both lie open already. */
  turnTo(page: BookPageName): void {
    this.#set({ page });
  }

  /** Shows the tables on the left page, or the plan again. */
  showTables(tables: boolean): void {
    this.#set({ tables, page: 'plan' });
  }

  setCamera(camera: Camera): void {
    this.#set({ camera });
  }

  setView(width: number, height: number): void {
    if (width !== this.#state.view.width || height !== this.#state.view.height) this.#set({ view: { width, height } });
  }

  say(message: BookMessage | null): void {
    this.#set({ message });
    if (message !== null) this.announce(message.text);
  }

  announce(text: string): void {
    this.#set({ announcement: { text, count: this.#state.announcement.count + 1 } });
  }

  copy(): void {
    const entries = this.#state.selection.flatMap((picked) => {
      const entry = picked.kind === 'entry' ? this.#state.document.entries.get(picked.id) : undefined;
      return entry === undefined ? [] : [entry];
    });
    if (entries.length > 0) this.#set({ clipboard: entries });
  }

  /** The tally engine arrives after the plan can be edited. */
  provideEngine(estimate: (input: RoomInput) => RoomTally): void {
    this.#tallies.use(estimate);
    this.#set({ engineReady: true });
  }

  /** Approved materials of the person's organisation, as they were read last. */
  provideOwnMaterials(materials: readonly PlaceableMaterial[]): void {
    this.#set({ ownMaterials: materials });
  }

  /** The tally of a room as it stands now; null while the engine is on its way or when the room is gone. */
  tally(roomId: string): RoomTally | null {
    return this.#tallies.read(this.#state.document, roomId, this.#state.limits);
  }

  /** What that tally is made from, for calculations in the background; the same object until the room changes. */
  roomInput(roomId: string): RoomInput | null {
    return this.#tallies.input(this.#state.document, roomId, this.#state.limits);
  }

  #step(direction: 'undo' | 'redo'): void {
    if (!this.#state.canEdit) return;
    const step = this.#history[direction](this.#state.document);
    if (step === null) return;
    if (step.changes.length > 0) this.#commit(step.changes, step.label);
    this.#ports.keepSteps(this.#history.steps());
    this.select(step.selection);
    if (step.skipped.length > 0) this.say({ kind: 'notice', text: step.skipped.join(' ') });
    else this.announce(step.label);
  }

  #commit(changes: Changes, label: string): void {
    this.#set({ document: applyChanges(this.#state.document, changes), message: null });
    this.#ports.queue({ id: this.#ports.newId(), label, changes: [...changes] });
  }

  #refuse(refusal: Refusal, options: RunOptions): Refusal {
    if (options.refusal !== 'returned') this.say({ kind: 'refusal', text: refusal.message, refusal });
    return refusal;
  }

  #roomOf(picked: Selected | undefined): string | undefined {
    if (picked?.kind === 'room') return picked.id;
    if (picked?.kind === 'entry') return this.#state.document.entries.get(picked.id)?.room_id;
    return undefined;
  }

  #set(patch: Partial<BookState>): void {
    const next = { ...this.#state, ...patch };
    this.#state = {
      ...next,
      ...stillThere(next),
      canUndo: this.#history.nextUndo(),
      canRedo: this.#history.nextRedo(),
    };
    for (const reader of this.#readers) reader();
  }
}

const READ_ONLY: Refusal = {
  refused: true,
  code: 'SURVEY_READ_ONLY',
  message: 'Your role on this site lets you read the book but not change it. Nothing was changed.',
};

/** The storey one comes in by: the one nearest to level 0. */
function groundStorey(document: SurveyDocument): string | null {
  const storeys = [...document.storeys.values()];
  const away = (level_m: number) => Math.abs(level_m);
  return storeys.sort((a, b) => away(a.level_m) - away(b.level_m))[0]?.id ?? null;
}

function firstRoom(document: SurveyDocument, storeyId: string | null): string | null {
  return storeyId === null ? null : (roomsInReadingOrder(document, storeyId)[0]?.id ?? null);
}

/** Drops from the view what the document no longer holds. */
function stillThere(state: BookState): Pick<BookState, 'selection' | 'storeyId' | 'roomInHand'> {
  const { document } = state;
  const storeyId =
    state.storeyId !== null && document.storeys.has(state.storeyId) ? state.storeyId : groundStorey(document);
  const roomInHand =
    state.roomInHand !== null && document.rooms.has(state.roomInHand)
      ? state.roomInHand
      : firstRoom(document, storeyId);
  const selection = state.selection.every((picked) => exists(document, picked))
    ? state.selection
    : state.selection.filter((picked) => exists(document, picked));
  return { storeyId, roomInHand, selection };
}

function exists(document: SurveyDocument, picked: Selected): boolean {
  switch (picked.kind) {
    case 'room':
      return document.rooms.has(picked.id);
    case 'corner':
      return document.corners.has(picked.id);
    case 'opening':
      return document.openings.has(picked.id);
    case 'entry':
      return document.entries.has(picked.id);
    case 'wall':
      return picked.id.split('|').every((corner) => document.corners.has(corner));
  }
}
