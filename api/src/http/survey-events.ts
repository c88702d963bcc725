import type { Request, Response } from 'express';
import type { Logger } from 'pino';
import type { Sessions, SignedIn } from '../auth/sessions.ts';
import type { SurveyFeed } from '../events/survey-feed.ts';
import type { AccessService } from '../services/access-service.ts';
import type { SurveyService } from '../services/survey-service.ts';
import type { Answer } from './define-route.ts';

const HEARTBEAT_ms = 20_000;
const BATCH = 100;
/** Browsers wait this long before they come back, ms. */
const RETRY_ms = 2000;

interface EventParts {
  readonly feed: SurveyFeed;
  readonly surveys: SurveyService;
  readonly sessions: Sessions;
  readonly access: AccessService;
  readonly log: Logger;
  /** Time between heartbeats, ms; shorter in tests. */
  readonly heartbeat_ms?: number;
}

interface Stream {
  readonly surveyId: string;
  /** Where to begin when the browser does not say. */
  readonly from: number;
  readonly request: Request;
  readonly signedIn: SignedIn | null;
}

/**
 * Streams of server-sent events: one event per accepted change set, its id the sequence. Each heartbeat asks again
 * whether the session lives and the role still reads; a stream whose reader lost either ends.
 */
export class SurveyEvents {
  private readonly parts: EventParts;
  private readonly open = new Set<Response>();

  constructor(parts: EventParts) {
    this.parts = parts;
  }

  stream({ surveyId, from, request, signedIn }: Stream): Answer<undefined> {
    const given = Number(request.headers['last-event-id']);
    const start = Number.isInteger(given) && given >= 0 ? given : from;
    return {
      kind: 'stream',
      headers: { 'Cache-Control': 'no-store', 'X-Accel-Buffering': 'no' },
      write: (_request, response) => this.write(response, surveyId, start, signedIn),
    };
  }

  /** Ends every stream, so that the server can stop. */
  close(): void {
    for (const response of this.open) response.end();
  }

  private async write(response: Response, surveyId: string, start: number, signedIn: SignedIn | null): Promise<void> {
    response.type('text/event-stream');
    response.flushHeaders();
    response.write(`retry: ${RETRY_ms}\n\n`);
    this.open.add(response);
    let sequence = start;
    let reading = false;
    let again = false;
    const send = async (): Promise<void> => {
      if (reading) {
        again = true;
        return;
      }
      reading = true;
      try {
        do {
          again = false;
          const { items, more } = await this.parts.surveys.changesAfter(surveyId, sequence, BATCH);
          for (const item of items) {
            response.write(`id: ${item.sequence}\nevent: change-set\ndata: ${JSON.stringify(item)}\n\n`);
            sequence = item.sequence;
          }
          again ||= more;
        } while (again && !response.writableEnded);
      } finally {
        reading = false;
      }
    };
    const attempt = (work: () => Promise<void>): void => {
      work().catch((error: unknown) => {
        this.parts.log.warn({ err: error, surveyId }, 'an event stream ended early');
        response.end();
      });
    };
    const unwatch = this.parts.feed.watch(surveyId, () => attempt(send));
    const heartbeat = setInterval(
      () =>
        attempt(async () => {
          if (!(await this.mayRead(surveyId, signedIn))) {
            response.end();
            return;
          }
          response.write(': still here\n\n');
          // Also a second way to hear of changes, should a notice have been lost.
          await send();
        }),
      this.parts.heartbeat_ms ?? HEARTBEAT_ms,
    );
    attempt(send);
    await new Promise<void>((done) => response.once('close', done));
    clearInterval(heartbeat);
    unwatch();
    this.open.delete(response);
  }

  private async mayRead(surveyId: string, signedIn: SignedIn | null): Promise<boolean> {
    if (signedIn === null) return false;
    const present = await this.parts.sessions.find(signedIn.token);
    return present !== null && (await this.parts.access.find(present.actor, 'survey', surveyId)) !== null;
  }
}
