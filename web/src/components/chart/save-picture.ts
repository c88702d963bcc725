import { saveFile } from './save-file.ts';

/**
 * Hands a chart's picture to the browser's own download.
 * @param address PNG data URL; null while nothing is painted, and nothing happens
 */
export function savePicture(fileName: string, address: string | null): void {
  if (address === null) return;
  const bytes = Uint8Array.from(atob(address.slice(address.indexOf(',') + 1)), (char) => char.charCodeAt(0));
  saveFile(`${fileName}.png`, new Blob([bytes], { type: 'image/png' }));
}
