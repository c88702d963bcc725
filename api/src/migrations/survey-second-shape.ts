import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Columns of the survey document's version 2. Defaults fill the rows that are there and are taken off again. */
const UP = [
  `SET LOCAL lock_timeout = '10s'`,
  `ALTER TABLE "room" ADD COLUMN "assumptions" jsonb, ADD COLUMN "photos" jsonb NOT NULL DEFAULT '[]', ADD COLUMN "to_do" text NOT NULL DEFAULT ''`,
  `ALTER TABLE "room" ALTER COLUMN "photos" DROP DEFAULT, ALTER COLUMN "to_do" DROP DEFAULT`,
  `ALTER TABLE "entry" ADD COLUMN "measure" jsonb`,
];
const DOWN = [
  `ALTER TABLE "entry" DROP COLUMN "measure"`,
  `ALTER TABLE "room" DROP COLUMN "assumptions", DROP COLUMN "photos", DROP COLUMN "to_do"`,
];

export class SurveySecondShape1764590400000 implements MigrationInterface {
  readonly name = 'SurveySecondShape1764590400000';

  async up(runner: QueryRunner): Promise<void> {
    for (const statement of UP) await runner.query(statement);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const statement of DOWN) await runner.query(statement);
  }
}
