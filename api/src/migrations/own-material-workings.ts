import type { MigrationInterface, QueryRunner } from 'typeorm';

/** The heats, and the workings that are long and seldom read, in columns of their own: lists need not read them. */
const COLUMNS = [
  '"net_MJ_kg" double precision',
  '"low_MJ_kg" double precision',
  '"high_MJ_kg" double precision',
  '"workings" json',
];
const NAMES = COLUMNS.map((column) => column.split(' ')[0] ?? '');

/** The rows say the same as before, in other places: the trigger that keeps them looks away meanwhile. */
const unwatched = (statement: string): readonly string[] => [
  'ALTER TABLE "own_material_version" DISABLE TRIGGER "own_material_version_stays"',
  statement,
  'ALTER TABLE "own_material_version" ENABLE TRIGGER "own_material_version_stays"',
];

/** @param content columns that never change once a version is put forward */
const keep = (content: readonly string[]): string => {
  const row = (side: 'NEW' | 'OLD'): string => `(${content.map((name) => `${side}.${name}`).join(', ')})`;
  return `CREATE OR REPLACE FUNCTION "keep_own_material_version"() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF TG_OP = 'DELETE' THEN
      IF OLD."state" <> 'draft' THEN
        RAISE EXCEPTION 'only drafts are deleted' USING ERRCODE = 'integrity_constraint_violation';
      END IF;
      RETURN OLD;
    END IF;
    IF (NEW."id", NEW."material_id", NEW."version", NEW."author_id", NEW."made_at")
       IS DISTINCT FROM (OLD."id", OLD."material_id", OLD."version", OLD."author_id", OLD."made_at")
       OR (OLD."state" <> 'draft' AND ${row('NEW')} IS DISTINCT FROM ${row('OLD')})
    THEN
      RAISE EXCEPTION 'a version that was put forward is never changed' USING ERRCODE = 'integrity_constraint_violation';
    END IF;
    IF NEW."state" <> OLD."state" AND (OLD."state", NEW."state") NOT IN
       (('draft', 'put-forward'), ('put-forward', 'approved'), ('put-forward', 'returned'), ('approved', 'withdrawn'))
    THEN
      RAISE EXCEPTION 'a version does not go from % to %', OLD."state", NEW."state" USING ERRCODE = 'integrity_constraint_violation';
    END IF;
    IF NEW."state" = 'approved' AND (NEW."decided_by" IS NULL OR NEW."decided_by" = NEW."author_id") THEN
      RAISE EXCEPTION 'a version is approved by another than its author' USING ERRCODE = 'integrity_constraint_violation';
    END IF;
    RETURN NEW;
  END $$`;
};
const BEFORE = ['"draft"', '"derived"::text'];
const AFTER = [...BEFORE, ...NAMES.map((name) => (name === '"workings"' ? `${name}::text` : name))];

export class OwnMaterialWorkings1764676800000 implements MigrationInterface {
  readonly name = 'OwnMaterialWorkings1764676800000';

  async up(runner: QueryRunner): Promise<void> {
    const statements = [
      `SET LOCAL lock_timeout = '10s'`,
      `ALTER TABLE "own_material_version" ${COLUMNS.map((column) => `ADD COLUMN ${column}`).join(', ')}`,
      ...unwatched(`UPDATE "own_material_version" SET "net_MJ_kg" = ("derived"->>'net_MJ_kg')::float8,
        "low_MJ_kg" = ("derived"->>'low_MJ_kg')::float8, "high_MJ_kg" = ("derived"->>'high_MJ_kg')::float8,
        "workings" = "derived"->'workings', "derived" = ("derived"::jsonb - 'workings')::json`),
      `ALTER TABLE "own_material_version" ${NAMES.map((name) => `ALTER COLUMN ${name} SET NOT NULL`).join(', ')}`,
      keep(AFTER),
    ];
    for (const statement of statements) await runner.query(statement);
  }

  async down(runner: QueryRunner): Promise<void> {
    const statements = [
      keep(BEFORE),
      ...unwatched(
        `UPDATE "own_material_version" SET "derived" = ("derived"::jsonb || jsonb_build_object('workings', "workings"::jsonb))::json`,
      ),
      `ALTER TABLE "own_material_version" ${NAMES.map((name) => `DROP COLUMN ${name}`).join(', ')}`,
    ];
    for (const statement of statements) await runner.query(statement);
  }
}
