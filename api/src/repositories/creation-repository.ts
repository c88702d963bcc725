import { createHash } from 'node:crypto';
import { SqlRepository } from './sql-repository.ts';

/** Ids that clients make: used once, by one person, for one body. */
export class CreationRepository extends SqlRepository {
  /**
   * Claims an id inside the transaction that creates the thing.
   * @returns `new` to go on, `same` when this person sent this very body before, `other` when the id is taken
   */
  async claim(id: string, personId: string, body: unknown, at: Date): Promise<'new' | 'same' | 'other'> {
    const bodyHash = createHash('sha256').update(JSON.stringify(body)).digest('hex');
    const added = await this.rows(
      'INSERT INTO creation (id, person_id, body_hash, at) VALUES ($1, $2, $3, $4) ON CONFLICT (id) DO NOTHING RETURNING id',
      [id, personId, bodyHash, at],
    );
    if (added.length > 0) return 'new';
    const known = await this.row<{ person_id: string; body_hash: string }>(
      'SELECT person_id, body_hash FROM creation WHERE id = $1',
      [id],
    );
    return known?.person_id === personId && known.body_hash === bodyHash ? 'same' : 'other';
  }
}
