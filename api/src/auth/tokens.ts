import { createHash, randomBytes } from 'node:crypto';

/** A secret of 256 bits in URL-safe text. */
export const newToken = (): string => randomBytes(32).toString('base64url');

/** What is stored of a secret or an address: its SHA-256 in hex. */
export const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex');
