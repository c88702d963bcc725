import type { Entry } from '@embertally/shared/survey/survey-document';
import { halfExtent } from '../interaction/footprint-space.ts';
import { paintEntry } from './paint-entry.ts';
import { at, type Pen } from './pen.ts';
import type { Palette } from './palette.ts';

/** Side of a tile on the plan, m. */
const TILE_M = 10;
/** With fewer entries than this each is drawn anew every time: sharper and simpler. */
const TILES_FROM = 300;
/** Larger bitmaps than this cost more memory than they save time, px. */
const LARGEST_PX = 2200;
const EDGE_PX = 4;

interface Tile {
  readonly entries: readonly Entry[];
  readonly left: number;
  readonly right: number;
  readonly bottom: number;
  readonly top: number;
  bitmap: { readonly canvas: HTMLCanvasElement; readonly pxPerM: number; readonly palette: Palette } | null;
}

/**
 * Draws the entries of a storey. Many entries are kept as bitmaps by tiles of 10 m: panning copies bitmaps, and an edit
 * draws only the tile it happened in. While the zoom is moving an older bitmap is stretched; `sharp` asks for new ones.
 */
export class EntryTiles {
  #entries: readonly Entry[] = [];
  #hidden: ReadonlySet<string> = new Set();
  #tiles = new Map<string, Tile>();

  paint(pen: Pen, entries: readonly Entry[], hidden: ReadonlySet<string>, sharp: boolean): void {
    if (entries.length < TILES_FROM) {
      for (const entry of entries) if (!hidden.has(entry.id) && inView(pen, entry)) paintEntry(pen, entry);
      return;
    }
    this.#follow(entries, hidden);
    for (const tile of this.#tiles.values()) this.#paintTile(pen, tile, sharp);
  }

  #paintTile(pen: Pen, tile: Tile, sharp: boolean): void {
    const { context, camera, view, palette } = pen;
    const topLeft = at(pen, { x_m: tile.left, y_m: tile.top });
    const width = (tile.right - tile.left) * camera.pxPerM;
    const height = (tile.top - tile.bottom) * camera.pxPerM;
    if (topLeft.x > view.width || topLeft.y > view.height || topLeft.x + width < 0 || topLeft.y + height < 0) return;
    if (Math.max(width, height) > LARGEST_PX) {
      for (const entry of tile.entries) if (inView(pen, entry)) paintEntry(pen, entry);
      return;
    }
    const stale = tile.bitmap?.palette !== palette || (sharp && tile.bitmap.pxPerM !== camera.pxPerM);
    if (stale) tile.bitmap = { canvas: drawn(pen, tile, width, height), pxPerM: camera.pxPerM, palette };
    if (tile.bitmap === null) return;
    const edge = (EDGE_PX * camera.pxPerM) / tile.bitmap.pxPerM;
    context.drawImage(tile.bitmap.canvas, topLeft.x - edge, topLeft.y - edge, width + 2 * edge, height + 2 * edge);
  }

  #follow(entries: readonly Entry[], hidden: ReadonlySet<string>): void {
    if (entries === this.#entries && hidden === this.#hidden) return;
    const groups = new Map<string, Entry[]>();
    for (const entry of entries) {
      if (hidden.has(entry.id)) continue;
      const key = `${Math.floor(entry.x_m / TILE_M)} ${Math.floor(entry.y_m / TILE_M)}`;
      const group = groups.get(key);
      if (group === undefined) groups.set(key, [entry]);
      else group.push(entry);
    }
    const tiles = new Map<string, Tile>();
    for (const [key, group] of groups) {
      const before = this.#tiles.get(key);
      const same = before?.entries.length === group.length && before.entries.every((entry, i) => entry === group[i]);
      tiles.set(key, same ? before : tileOf(group));
    }
    this.#tiles = tiles;
    this.#entries = entries;
    this.#hidden = hidden;
  }
}

function tileOf(entries: readonly Entry[]): Tile {
  let left = Infinity;
  let right = -Infinity;
  let bottom = Infinity;
  let top = -Infinity;
  for (const entry of entries) {
    const half = halfExtent(entry);
    left = Math.min(left, entry.x_m - half.x_m);
    right = Math.max(right, entry.x_m + half.x_m);
    bottom = Math.min(bottom, entry.y_m - half.y_m);
    top = Math.max(top, entry.y_m + half.y_m);
  }
  return { entries, left, right, bottom, top, bitmap: null };
}

function drawn(pen: Pen, tile: Tile, width: number, height: number): HTMLCanvasElement {
  const ratio = window.devicePixelRatio;
  const canvas = document.createElement('canvas');
  const view = { width: width + 2 * EDGE_PX, height: height + 2 * EDGE_PX };
  canvas.width = Math.ceil(view.width * ratio);
  canvas.height = Math.ceil(view.height * ratio);
  const context = canvas.getContext('2d');
  if (context === null) return canvas;
  context.scale(canvas.width / view.width, canvas.height / view.height);
  const camera = {
    x_m: (tile.left + tile.right) / 2,
    y_m: (tile.bottom + tile.top) / 2,
    pxPerM: pen.camera.pxPerM,
  };
  const own: Pen = { context, camera, view, palette: pen.palette };
  for (const entry of tile.entries) paintEntry(own, entry);
  return canvas;
}

function inView(pen: Pen, entry: Entry): boolean {
  const { x, y } = at(pen, entry);
  const half = halfExtent(entry);
  const dx = half.x_m * pen.camera.pxPerM + EDGE_PX;
  const dy = half.y_m * pen.camera.pxPerM + EDGE_PX;
  return x + dx >= 0 && x - dx <= pen.view.width && y + dy >= 0 && y - dy <= pen.view.height;
}
