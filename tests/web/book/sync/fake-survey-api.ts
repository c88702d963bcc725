import { applyChangeSet, readChanges, type FedChangeSet } from '@embertally/shared/contracts/surveys';
import type { ChangeSetBody } from '@embertally/shared/survey/change';
import { mergeChangeSet } from '@embertally/shared/survey/merge-change-set';
import { sameValue } from '@embertally/shared/survey/same-value';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { fakeServer, type FakeRequest, type FakeServer } from '../../../support/fake-server.ts';
import { NOW } from '../book-driver.ts';

/** The server's side of saving at the network's edge: one document, its feed, and the ways in which a network fails. */
export class FakeSurveyApi {
  readonly net: FakeServer = fakeServer();
  document: SurveyDocument;
  readonly feed: FedChangeSet[] = [];
  /** Ids in the order they were asked for, repeats included. */
  readonly sent: string[] = [];
  /** Applied, and then the answer is lost on the way back. */
  loseAnswers = 0;
  #refusal: {
    readonly status: number;
    readonly detail: string;
    readonly only: (set: ChangeSetBody) => boolean;
  } | null = null;

  constructor(document: SurveyDocument) {
    this.document = document;
    const params = { surveyId: document.surveyId };
    this.net.raw(applyChangeSet, params, (request) => this.#receive(request));
    this.net.answer(readChanges, params, ({ query }) => {
      const after = Number(query.get('after'));
      return {
        items: this.feed.filter(({ sequence }) => sequence > after),
        sequence: this.document.sequence,
        more: false,
      };
    });
  }

  refuse(status: number, detail: string, only: (set: ChangeSetBody) => boolean = () => true): void {
    this.#refusal = { status, detail, only };
  }

  accept(): void {
    this.#refusal = null;
  }

  /** Somebody else's change set. */
  theirs(body: ChangeSetBody): void {
    if (!this.#apply(body, 'Tamsin Reddaway')) throw new Error('their own change set must fit');
  }

  #receive(request: FakeRequest): Response {
    const body = request.body as ChangeSetBody;
    this.sent.push(body.id);
    const refusal = this.#refusal;
    if (refusal?.only(body) === true) return problem(refusal.status, { detail: refusal.detail });
    const known = this.feed.find(({ id }) => id === body.id);
    if (known !== undefined) return answer(known);
    const outcome = mergeChangeSet(this.document, body.changes);
    if (!outcome.ok) {
      const clashes = outcome.clashes.map((clash) => ({ ...clash, by: 'Tamsin Reddaway', at: NOW }));
      return problem(409, { detail: 'Somebody else changed the same thing.', clashes });
    }
    const fed = this.#apply(body, 'Ines Okoro');
    if (this.loseAnswers > 0) {
      this.loseAnswers -= 1;
      throw new TypeError('Failed to fetch');
    }
    if (fed === null) throw new Error('merged once and not twice');
    return answer(fed);
  }

  #apply(body: ChangeSetBody, name: string): FedChangeSet | null {
    const outcome = mergeChangeSet(this.document, body.changes);
    if (!outcome.ok) return null;
    const sequence = this.document.sequence + 1;
    const fed = {
      id: body.id,
      sequence,
      label: body.label,
      changes: [...outcome.changes],
      by: { person_id: '5f0f0f0f-0000-4000-8000-000000000000', name },
      at: NOW,
    };
    this.document = { ...outcome.document, sequence };
    this.feed.push(fed);
    return fed;
  }

  /** Whether both sides hold the same rows. */
  agreesWith(document: SurveyDocument): boolean {
    const rows = (of: SurveyDocument) =>
      [of.storeys, of.corners, of.rooms, of.openings, of.entries].map((map) =>
        [...map.values()].sort((a, b) => (a.id < b.id ? -1 : 1)),
      );
    return sameValue(rows(document), rows(this.document));
  }
}

function answer({ id, sequence, changes }: FedChangeSet): Response {
  return new Response(JSON.stringify({ id, sequence, changes }), {
    status: 201,
    headers: { 'content-type': 'application/json' },
  });
}

function problem(status: number, more: Record<string, unknown>): Response {
  const body = { type: 'about:blank', title: 'Refused', status, instance: '/', requestId: 'r-1', ...more };
  return new Response(JSON.stringify(body), { status, headers: { 'content-type': 'application/problem+json' } });
}
