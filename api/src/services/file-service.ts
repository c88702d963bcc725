import { FILE_TYPES, type FileType, type StoredFile } from '@embertally/shared/contracts/files';
import type { Logger } from 'pino';
import type { Readable } from 'node:stream';
import type { Actor, Trail } from '../actor.ts';
import type { Clock } from '../clock.ts';
import { Fault } from '../fault.ts';
import { CONTENT_CHECKS } from '../files/content-checks.ts';
import type { FileStore, StagedFile } from '../files/file-store.ts';
import type { Database } from '../repositories/database.ts';
import { StoredFileRepository, storedFile } from '../repositories/stored-file-repository.ts';
import { recordEvent } from './audit-record.ts';
import { claimId } from './claim-id.ts';

const HOUR_ms = 3600 * 1000;
/** An upload that did not come to its end in this time never will. */
const ARRIVING_ms = HOUR_ms;
/** Time to save the thing a file was sent for. */
const UNREFERRED_ms = 24 * HOUR_ms;

interface FileParts {
  readonly database: Database;
  readonly clock: Clock;
  readonly log: Logger;
  readonly files: FileStore;
  /** Most bytes one organisation keeps. */
  readonly fileQuota_bytes: number;
}

interface FileInput {
  readonly id: string;
  readonly name: string;
  readonly type: FileType;
}

/** Files people send: known by their content, kept once, given back to their own organisation. */
export class FileService {
  private readonly parts: FileParts;

  constructor(parts: FileParts) {
    this.parts = parts;
  }

  /**
   * Takes a file in. Nothing of it is kept when it is not what it says or the organisation's room is used up.
   * @throws Fault 415, 422, 507, 409 when the id was used for something else
   */
  async send(actor: Actor, input: FileInput, pieces: AsyncIterable<Uint8Array>, trail: Trail): Promise<StoredFile> {
    const staged = await this.parts.files.stage(checked(input.type, pieces));
    try {
      await this.enter(actor, input, staged, trail);
      await staged.keep(keyOf(input.id));
    } finally {
      await staged.drop();
    }
    const files = new StoredFileRepository(this.parts.database.statements);
    await files.arrived(input.id);
    const row = await files.find(actor.organisationId, input.id);
    if (row === null) {
      throw new Fault(
        'conflict',
        'file-gone',
        'This file was given up meanwhile; nothing was kept. Send it again with a new id.',
      );
    }
    return storedFile(row);
  }

  /** @throws Fault 404 for a file of another organisation, as for none */
  async read(actor: Actor, id: string): Promise<StoredFile & { readonly pieces: Readable }> {
    const row = await new StoredFileRepository(this.parts.database.statements).find(actor.organisationId, id);
    if (row === null) throw Fault.notFound();
    const content = await this.parts.files.read(row.file_key);
    if (content === null) {
      throw new Fault(
        'conflict',
        'file-lost',
        'This file is not on the server any more. Whoever has it can attach it again.',
      );
    }
    return { ...storedFile(row), pieces: content.pieces };
  }

  /** Removes uploads that never ended and files that nothing refers to a day after they came. */
  async sweep(): Promise<void> {
    const { database, clock, files, log } = this.parts;
    const now = clock.now().getTime();
    const before = { arriving: new Date(now - ARRIVING_ms), unreferred: new Date(now - UNREFERRED_ms) };
    await files.removeUnfinished(before.arriving);
    const leaving = await database.transaction((statements) =>
      new StoredFileRepository(statements).markLeaving(before),
    );
    for (const { id, file_key } of leaving) {
      await files.remove(file_key);
      await new StoredFileRepository(database.statements).forget(id);
    }
    if (leaving.length > 0) log.info({ files: leaving.length }, 'files that nothing refers to were removed');
  }

  /** Enters the file before its content gets its name: whatever breaks off after is found again by its row. */
  private async enter(actor: Actor, input: FileInput, staged: StagedFile, trail: Trail): Promise<void> {
    const at = this.parts.clock.now();
    const { bytes, sha256 } = staged;
    await this.parts.database.transaction(async (statements) => {
      const sent = { ...input, sha256 };
      const isNew = await claimId(statements, actor, sent, at);
      const files = new StoredFileRepository(statements);
      const kept = await files.lockBytes(actor.organisationId);
      if (isNew && kept + bytes > this.parts.fileQuota_bytes) throw this.quotaReached();
      await files.add({
        ...input,
        organisation_id: actor.organisationId,
        person_id: actor.personId,
        bytes,
        sha256,
        file_key: keyOf(input.id),
        created_at: at,
      });
      if (!isNew) return;
      await recordEvent(statements, {
        chain: { kind: 'organisation', id: actor.organisationId },
        actor,
        action: 'file.sent',
        object: { kind: 'file', id: input.id },
        facts: { name: input.name, type: input.type, bytes, sha256 },
        trail,
        at,
      });
    });
  }

  private quotaReached(): Fault {
    const most_MB = Math.round(this.parts.fileQuota_bytes / 1024 / 1024);
    return new Fault(
      'full',
      'quota-reached',
      `The files of your organisation together would be more than ${most_MB} MB, so this one was not kept. Ask whoever runs the server for more room.`,
    );
  }
}

const keyOf = (id: string): string => `file-${id}`;

/** Passes the pieces on while the content can still be what it says. */
async function* checked(type: FileType, pieces: AsyncIterable<Uint8Array>): AsyncIterable<Uint8Array> {
  const check = CONTENT_CHECKS[type]();
  let bytes = 0;
  for await (const piece of pieces) {
    bytes += piece.byteLength;
    if (!check.push(piece)) throw notWhatItSays(type);
    yield piece;
  }
  if (bytes === 0) {
    throw Fault.invalid([
      { pointer: '', code: 'FILE_EMPTY', message: 'The file is empty; choose the one with the content.' },
    ]);
  }
  if (!check.end()) throw notWhatItSays(type);
}

function notWhatItSays(type: FileType): Fault {
  return new Fault(
    'wrong-media',
    'file-not-what-it-says',
    `The content of this file is not that of a ${FILE_TYPES[type].word}, or it is damaged, or it is a picture of more than 50 million points. Nothing was kept; choose another file.`,
  );
}
