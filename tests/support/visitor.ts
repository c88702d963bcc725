import type { Server } from 'node:http';
import request, { type Test } from 'supertest';

const UNSAFE = new Set(['post', 'patch', 'put', 'delete']);

/**
 * A browser in front of the server: keeps cookies (also Secure ones, as a browser does on loopback) and sends what our
 * pages send with unsafe methods.
 */
export class Visitor {
  readonly cookies = new Map<string, string>();
  private readonly server: Server;
  private readonly origin: string;

  constructor(server: Server, origin: string) {
    this.server = server;
    this.origin = origin;
  }

  get(path: string): Test {
    return this.send('get', path);
  }

  post(path: string, body?: object): Test {
    return this.send('post', path, body);
  }

  patch(path: string, body: object, etag?: string): Test {
    const sent = this.send('patch', path, body);
    return etag === undefined ? sent : sent.set('If-Match', etag);
  }

  delete(path: string, etag?: string): Test {
    const sent = this.send('delete', path);
    return etag === undefined ? sent : sent.set('If-Match', etag);
  }

  send(method: 'get' | 'post' | 'patch' | 'put' | 'delete', path: string, body?: object): Test {
    const test = this.bare(method, path);
    if (UNSAFE.has(method)) test.set('Origin', this.origin).set('X-Embertally', 'web');
    return body === undefined ? test : test.send(body);
  }

  /** The request with its cookies and nothing else. */
  bare(method: 'get' | 'post' | 'patch' | 'put' | 'delete', path: string): Test {
    const test = request(this.server)[method](path);
    if (this.cookies.size > 0) test.set('Cookie', this.cookieHeader());
    test.on('response', (response: { headers: Record<string, unknown> }) => {
      const set = response.headers['set-cookie'];
      if (Array.isArray(set)) for (const cookie of set as string[]) this.keep(cookie);
    });
    return test;
  }

  cookieHeader(): string {
    return [...this.cookies].map(([name, value]) => `${name}=${value}`).join('; ');
  }

  private keep(cookie: string): void {
    const [pair = ''] = cookie.split(';');
    const at = pair.indexOf('=');
    const [name, value] = [pair.slice(0, at), pair.slice(at + 1)];
    if (value === '') this.cookies.delete(name);
    else this.cookies.set(name, value);
  }
}
