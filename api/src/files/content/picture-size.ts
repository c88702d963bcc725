const MOST_PIXELS = 50e6;

/** Whether a picture of so many pixels can be shown without filling a tablet's memory; nothing is that wide or high by mistake. */
export function pictureSizeFits(width_px: number, height_px: number): boolean {
  return width_px > 0 && height_px > 0 && width_px * height_px <= MOST_PIXELS;
}
