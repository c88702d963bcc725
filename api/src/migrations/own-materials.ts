import type { MigrationInterface, QueryRunner } from 'typeorm';

const TABLES = [
  `CREATE TABLE "stored_file" (
    "id" uuid NOT NULL,
    "organisation_id" uuid NOT NULL,
    "person_id" uuid NOT NULL,
    "name" text NOT NULL,
    "type" text NOT NULL,
    "bytes" integer NOT NULL,
    "sha256" text NOT NULL,
    "file_key" text NOT NULL,
    "state" text NOT NULL,
    "created_at" timestamptz NOT NULL,
    CONSTRAINT "stored_file_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "own_material" (
    "id" uuid NOT NULL,
    "organisation_id" uuid NOT NULL,
    "label" text NOT NULL,
    "latest" integer NOT NULL,
    "in_force" integer,
    "tag" integer NOT NULL,
    "created_at" timestamptz NOT NULL,
    CONSTRAINT "own_material_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "own_material_version" (
    "id" uuid NOT NULL,
    "material_id" uuid NOT NULL,
    "version" integer NOT NULL,
    "state" text NOT NULL,
    "draft" jsonb NOT NULL,
    "derived" json NOT NULL,
    "author_id" uuid NOT NULL,
    "made_at" timestamptz NOT NULL,
    "edited_at" timestamptz NOT NULL,
    "put_forward_at" timestamptz,
    "decided_by" uuid,
    "decided_at" timestamptz,
    "decision_reason" text,
    "withdrawn_by" uuid,
    "withdrawn_at" timestamptz,
    "withdrawal_reason" text,
    CONSTRAINT "own_material_version_number_unique" UNIQUE ("material_id", "version"),
    CONSTRAINT "own_material_version_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "own_material_evidence" (
    "version_id" uuid NOT NULL,
    "file_id" uuid NOT NULL,
    "position" integer NOT NULL,
    CONSTRAINT "own_material_evidence_pk" PRIMARY KEY ("version_id", "file_id")
  )`,
];

const INDEXES = [
  `CREATE INDEX "stored_file_organisation" ON "stored_file" ("organisation_id")`,
  `CREATE INDEX "stored_file_person" ON "stored_file" ("person_id")`,
  `CREATE INDEX "own_material_organisation" ON "own_material" ("organisation_id")`,
  `CREATE UNIQUE INDEX "own_material_version_one_open" ON "own_material_version" ("material_id") WHERE "state" IN ('draft', 'put-forward')`,
  `CREATE INDEX "own_material_version_author" ON "own_material_version" ("author_id")`,
  `CREATE INDEX "own_material_version_decided_by" ON "own_material_version" ("decided_by")`,
  `CREATE INDEX "own_material_version_withdrawn_by" ON "own_material_version" ("withdrawn_by")`,
  `CREATE INDEX "own_material_evidence_file" ON "own_material_evidence" ("file_id")`,
];

const FOREIGN_KEYS = [
  `ALTER TABLE "stored_file" ADD CONSTRAINT "stored_file_organisation_fk" FOREIGN KEY ("organisation_id") REFERENCES "organisation"("id") ON DELETE RESTRICT`,
  `ALTER TABLE "stored_file" ADD CONSTRAINT "stored_file_person_fk" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE RESTRICT`,
  `ALTER TABLE "own_material" ADD CONSTRAINT "own_material_organisation_fk" FOREIGN KEY ("organisation_id") REFERENCES "organisation"("id") ON DELETE RESTRICT`,
  `ALTER TABLE "own_material_version" ADD CONSTRAINT "own_material_version_material_fk" FOREIGN KEY ("material_id") REFERENCES "own_material"("id") ON DELETE CASCADE`,
  `ALTER TABLE "own_material_version" ADD CONSTRAINT "own_material_version_author_fk" FOREIGN KEY ("author_id") REFERENCES "person"("id") ON DELETE RESTRICT`,
  `ALTER TABLE "own_material_version" ADD CONSTRAINT "own_material_version_decided_by_fk" FOREIGN KEY ("decided_by") REFERENCES "person"("id") ON DELETE RESTRICT`,
  `ALTER TABLE "own_material_version" ADD CONSTRAINT "own_material_version_withdrawn_by_fk" FOREIGN KEY ("withdrawn_by") REFERENCES "person"("id") ON DELETE RESTRICT`,
  `ALTER TABLE "own_material_evidence" ADD CONSTRAINT "own_material_evidence_version_fk" FOREIGN KEY ("version_id") REFERENCES "own_material_version"("id") ON DELETE CASCADE`,
  `ALTER TABLE "own_material_evidence" ADD CONSTRAINT "own_material_evidence_file_fk" FOREIGN KEY ("file_id") REFERENCES "stored_file"("id") ON DELETE RESTRICT`,
];

/** What was put forward stays as it was read by whoever decides; the second person is a second person, by whatever way. */
const VERSIONS_STAY = [
  `CREATE FUNCTION "keep_own_material_version"() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF TG_OP = 'DELETE' THEN
      IF OLD."state" <> 'draft' THEN
        RAISE EXCEPTION 'only drafts are deleted' USING ERRCODE = 'integrity_constraint_violation';
      END IF;
      RETURN OLD;
    END IF;
    IF (NEW."id", NEW."material_id", NEW."version", NEW."author_id", NEW."made_at")
       IS DISTINCT FROM (OLD."id", OLD."material_id", OLD."version", OLD."author_id", OLD."made_at")
       OR (OLD."state" <> 'draft' AND (NEW."draft", NEW."derived"::text) IS DISTINCT FROM (OLD."draft", OLD."derived"::text))
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
  END $$`,
  `CREATE TRIGGER "own_material_version_stays" BEFORE UPDATE OR DELETE ON "own_material_version"
  FOR EACH ROW EXECUTE FUNCTION "keep_own_material_version"()`,
  `CREATE FUNCTION "keep_own_material_evidence"() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF EXISTS (
      SELECT 1 FROM "own_material_version" v WHERE v."state" <> 'draft'
        AND v."id" = CASE TG_OP WHEN 'INSERT' THEN NEW."version_id" ELSE OLD."version_id" END)
    THEN
      RAISE EXCEPTION 'the evidence of a version that was put forward is never changed' USING ERRCODE = 'integrity_constraint_violation';
    END IF;
    IF TG_OP = 'DELETE' THEN RETURN OLD; END IF;
    RETURN NEW;
  END $$`,
  `CREATE TRIGGER "own_material_evidence_stays" BEFORE INSERT OR UPDATE OR DELETE ON "own_material_evidence"
  FOR EACH ROW EXECUTE FUNCTION "keep_own_material_evidence"()`,
];

export class OwnMaterials1764633600000 implements MigrationInterface {
  readonly name = 'OwnMaterials1764633600000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`SET LOCAL lock_timeout = '10s'`);
    for (const statement of [...TABLES, ...INDEXES, ...FOREIGN_KEYS, ...VERSIONS_STAY]) await runner.query(statement);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const table of ['own_material_evidence', 'own_material_version', 'own_material', 'stored_file']) {
      await runner.query(`DROP TABLE "${table}" CASCADE`);
    }
    await runner.query('DROP FUNCTION "keep_own_material_evidence"()');
    await runner.query('DROP FUNCTION "keep_own_material_version"()');
  }
}
