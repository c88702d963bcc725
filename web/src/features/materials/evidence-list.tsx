import { readFile, type StoredFile } from '@embertally/shared/contracts/files';
import { contractUrl } from '../../lib/contract-url.ts';
import { dateWords } from '../../lib/date-words.ts';

/** The files that show where the figures come from, to save. */
export function EvidenceList({ files }: { readonly files: readonly StoredFile[] }) {
  if (files.length === 0) return <p className="pt-4 text-soft">No file is attached to this version.</p>;
  return (
    <ul>
      {files.map((file) => (
        <li key={file.id} className="border-b border-rule py-2">
          <a
            href={contractUrl(readFile, { fileId: file.id })}
            download={file.name}
            className="inline-block py-0.5 break-all"
          >
            {file.name}
          </a>
          <span className="block text-small text-soft">
            {size(file.bytes)}, sent by {file.sent_by}, {dateWords(file.sent_at, 'day')}
          </span>
        </li>
      ))}
    </ul>
  );
}

function size(bytes: number): string {
  if (bytes < 1024) return `${bytes} bytes`;
  const kilobytes = bytes / 1024;
  return kilobytes < 1024 ? `${kilobytes.toFixed(0)} kB` : `${(kilobytes / 1024).toFixed(1)} MB`;
}
