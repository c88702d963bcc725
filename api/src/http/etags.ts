import type { Request } from 'express';
import { Fault } from '../fault.ts';

export const versionTag = (version: number): string => `"v${version}"`;
export const sequenceTag = (sequence: number): string => `"s${sequence}"`;

/** No stored row has it: a tag that is not one of ours never matches. */
export const NO_VERSION = -1;

/** The version a change builds on. @throws Fault 428 when the caller did not say */
export function ifMatchVersion(request: Request): number {
  const header = request.headers['if-match'];
  if (header === undefined || header.trim() === '*') {
    throw new Fault(
      'precondition-missing',
      'if-match-missing',
      'Say which version the change builds on (If-Match, as read in ETag); nothing was changed.',
    );
  }
  const version = /^"v(\d{1,9})"$/.exec(header.trim())?.[1];
  return version === undefined ? NO_VERSION : Number(version);
}

/** Whether If-None-Match names this tag, weakly compared as RFC 9110 13.1.2 asks. */
export function alreadyHas(request: Request, tag: string): boolean {
  const header = request.headers['if-none-match'];
  if (header === undefined) return false;
  return header.split(',').some((one) => one.trim() === '*' || one.trim().replace(/^W\//, '') === tag);
}
