import type { FileType } from '@embertally/shared/contracts/files';
import type { ContentCheck } from './content/content-check.ts';
import { csvContent } from './content/csv-content.ts';
import { jpegContent } from './content/jpeg-content.ts';
import { pdfContent } from './content/pdf-content.ts';
import { pngContent } from './content/png-content.ts';

/** How each type is known by its content; its name says nothing. */
export const CONTENT_CHECKS: Readonly<Record<FileType, () => ContentCheck>> = {
  'application/pdf': pdfContent,
  'image/png': pngContent,
  'image/jpeg': jpegContent,
  'text/csv': csvContent,
};
