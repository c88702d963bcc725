import type { Request } from 'express';

const NAME = '__Host-device';
const YEAR_s = 365 * 24 * 3600;
const TOKEN = /^[A-Za-z0-9_-]{43}$/;

/** Carries no authority: it only tells a browser somebody has signed in from before. */
export function deviceCookie(token: string): string {
  return `${NAME}=${token}; Max-Age=${YEAR_s}; Path=/; HttpOnly; Secure; SameSite=Lax`;
}

export function readDeviceCookie(request: Request): string | null {
  for (const pair of (request.headers.cookie ?? '').split(';')) {
    const [name, value] = pair.trim().split('=', 2);
    if (name === NAME && value !== undefined && TOKEN.test(value)) return value;
  }
  return null;
}
