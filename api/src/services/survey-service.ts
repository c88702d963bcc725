import type { FedChangeSet, Survey } from '@embertally/shared/contracts/surveys';
import type { Database } from '../repositories/database.ts';
import type { SiteAccess } from '../actor.ts';
import { Fault } from '../fault.ts';
import { ChangeSetRepository } from '../repositories/change-set-repository.ts';
import { DocumentRepository } from '../repositories/document-repository.ts';
import { SurveyRepository } from '../repositories/survey-repository.ts';

const PAGE = 100;

/** Reading surveys: where they belong, the document, the feed. */
export class SurveyService {
  private readonly database: Database;

  constructor(database: Database) {
    this.database = database;
  }

  async read(access: SiteAccess, surveyId: string): Promise<Survey> {
    const survey = await new SurveyRepository(this.database.statements).find(surveyId);
    if (survey === null) throw Fault.notFound();
    return { ...survey, my_role: access.role, of_keeper: access.ofKeeper };
  }

  /** The document as JSON text, as PostgreSQL writes it in one read. */
  async documentText(surveyId: string): Promise<string> {
    const text = await new DocumentRepository(this.database.statements).text(surveyId);
    if (text === null) throw Fault.notFound();
    return text;
  }

  async sequence(surveyId: string): Promise<number> {
    const sequence = await new SurveyRepository(this.database.statements).sequence(surveyId);
    if (sequence === null) throw Fault.notFound();
    return sequence;
  }

  async changesAfter(
    surveyId: string,
    after: number,
    limit = PAGE,
  ): Promise<{ items: FedChangeSet[]; sequence: number; more: boolean }> {
    const sequence = await this.sequence(surveyId);
    const found = await new ChangeSetRepository(this.database.statements).after(surveyId, after, limit + 1);
    const items = found.slice(0, limit);
    return { items, sequence: Math.max(sequence, items.at(-1)?.sequence ?? 0), more: found.length > limit };
  }
}
