import { FILE_TYPES, sendFile as contract, type FileType, type StoredFile } from '@embertally/shared/contracts/files';
import { problemSchema } from '@embertally/shared/contracts/problem';
import { ContractError, OfflineError, problemError } from './api-errors.ts';
import { contractUrl } from './contract-url.ts';
import { sessionEnded } from './session-ended.ts';
import { ToldError } from './told-error.ts';

const BY_ENDING: Readonly<Record<string, FileType>> = {
  pdf: 'application/pdf',
  png: 'image/png',
  jpg: 'image/jpeg',
  jpeg: 'image/jpeg',
  csv: 'text/csv',
};

/** What can be chosen in a file dialog. */
export const FILE_ENDINGS = Object.keys(BY_ENDING).map((ending) => `.${ending}`);

/** The kind of file by the ending of its name, because browsers disagree about CSV; undefined where it is not taken. */
function typeOf(file: File): FileType | undefined {
  return BY_ENDING[file.name.split('.').at(-1)?.toLowerCase() ?? ''];
}

/**
 * Sends a file to be kept and says how far it is; `fetch` cannot tell.
 *
 * @param id made by the caller: sending again with the same id gives the stored answer
 * @param onProgress share that has left this device, 0 to 1
 * @throws ToldError for a file that would not be taken; otherwise as `call` does
 */
export function sendFile(
  file: File,
  id: string,
  onProgress: (share: number) => void,
  signal: AbortSignal,
): Promise<StoredFile> {
  const type = typeOf(file);
  if (type === undefined) {
    const words = Object.values(FILE_TYPES).map(({ word }) => word);
    return Promise.reject(new ToldError(`“${file.name}” is none of these: ${words.join(', ')}. Nothing was sent.`));
  }
  const { maxBytes, word } = FILE_TYPES[type];
  if (file.size > maxBytes) {
    const megabytes = (bytes: number) => `${(bytes / (1024 * 1024)).toFixed(1)} MB`;
    return Promise.reject(
      new ToldError(`A ${word} may have ${megabytes(maxBytes)}; “${file.name}” has ${megabytes(file.size)}.`),
    );
  }
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open(contract.method, contractUrl(contract, {}, { id, name: file.name.slice(-200) }));
    request.setRequestHeader('accept', 'application/json, application/problem+json');
    request.setRequestHeader('x-embertally', 'web');
    request.setRequestHeader('content-type', type);
    request.upload.onprogress = ({ loaded, total }) => {
      if (total > 0) onProgress(loaded / total);
    };
    request.onerror = () => {
      reject(new OfflineError());
    };
    request.onabort = () => {
      reject(new DOMException('The file was not sent.', 'AbortError'));
    };
    request.onload = () => {
      try {
        resolve(answerOf(request));
      } catch (error) {
        reject(error instanceof Error ? error : new ContractError(contract.id, 'unreadable', { cause: error }));
      }
    };
    signal.addEventListener('abort', () => {
      request.abort();
    });
    request.send(file);
  });
}

function answerOf(request: XMLHttpRequest): StoredFile {
  const body = jsonOf(request.responseText);
  if (request.status === contract.status) {
    const parsed = contract.response?.safeParse(body);
    if (parsed?.success === true) return parsed.data;
    throw new ContractError(contract.id, 'the answer is not what was promised');
  }
  if (request.status === 401) sessionEnded.set(true);
  const problem = problemSchema.safeParse(body);
  if (problem.success) throw problemError(problem.data, null);
  throw new ContractError(contract.id, `answered ${request.status} without a reason`);
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    // Something between us and the server may answer in its own words; the status says enough.
    return null;
  }
}
