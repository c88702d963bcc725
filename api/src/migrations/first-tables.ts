import type { MigrationInterface, QueryRunner } from 'typeorm';

const TABLES = [
  `CREATE TABLE "audit_chain" (
    "kind" text NOT NULL,
    "id" uuid NOT NULL,
    "position" integer NOT NULL,
    "hash" text NOT NULL,
    CONSTRAINT "audit_chain_pk" PRIMARY KEY ("kind", "id")
  )`,
  `CREATE TABLE "audit_event" (
    "chain_kind" text NOT NULL,
    "chain_id" uuid NOT NULL,
    "position" integer NOT NULL,
    "record" text NOT NULL,
    "hash" text NOT NULL,
    CONSTRAINT "audit_event_pk" PRIMARY KEY ("chain_kind", "chain_id", "position")
  )`,
  `CREATE TABLE "organisation" (
    "id" uuid NOT NULL,
    "name" text NOT NULL,
    "created_at" timestamptz NOT NULL,
    CONSTRAINT "organisation_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "site" (
    "id" uuid NOT NULL,
    "name" text NOT NULL,
    "address" text NOT NULL,
    "time_zone" text NOT NULL,
    "organisation_id" uuid NOT NULL,
    "version" integer NOT NULL,
    "created_at" timestamptz NOT NULL,
    "updated_at" timestamptz NOT NULL,
    CONSTRAINT "site_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "building" (
    "id" uuid NOT NULL,
    "site_id" uuid NOT NULL,
    "name" text NOT NULL,
    "version" integer NOT NULL,
    "created_at" timestamptz NOT NULL,
    "updated_at" timestamptz NOT NULL,
    CONSTRAINT "building_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "person" (
    "id" uuid NOT NULL,
    "name" text NOT NULL,
    "email" text NOT NULL,
    "password_hash" text NOT NULL,
    "units" text NOT NULL,
    "created_at" timestamptz NOT NULL,
    CONSTRAINT "person_email_unique" UNIQUE ("email"),
    CONSTRAINT "person_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "survey" (
    "id" uuid NOT NULL,
    "building_id" uuid NOT NULL,
    "kind" text NOT NULL,
    "sequence" integer NOT NULL,
    "created_at" timestamptz NOT NULL,
    "updated_at" timestamptz NOT NULL,
    CONSTRAINT "survey_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "change_set" (
    "id" uuid NOT NULL,
    "survey_id" uuid NOT NULL,
    "sequence" integer NOT NULL,
    "label" text NOT NULL,
    "body_hash" text NOT NULL,
    "changes" json NOT NULL,
    "person_id" uuid NOT NULL,
    "at" timestamptz NOT NULL,
    CONSTRAINT "change_set_survey_sequence_unique" UNIQUE ("survey_id", "sequence"),
    CONSTRAINT "change_set_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "storey" (
    "survey_id" uuid NOT NULL,
    "id" uuid NOT NULL,
    "name" text NOT NULL,
    "level_m" double precision NOT NULL,
    "height_m" double precision NOT NULL,
    "wall_thickness_m" double precision NOT NULL,
    "plan_picture" jsonb,
    "north_deg" double precision,
    "version" integer NOT NULL,
    CONSTRAINT "storey_pk" PRIMARY KEY ("survey_id", "id")
  )`,
  `CREATE TABLE "corner" (
    "survey_id" uuid NOT NULL,
    "id" uuid NOT NULL,
    "storey_id" uuid NOT NULL,
    "x_m" double precision NOT NULL,
    "y_m" double precision NOT NULL,
    "version" integer NOT NULL,
    CONSTRAINT "corner_pk" PRIMARY KEY ("survey_id", "id")
  )`,
  `CREATE TABLE "creation" (
    "id" uuid NOT NULL,
    "person_id" uuid NOT NULL,
    "body_hash" text NOT NULL,
    "at" timestamptz NOT NULL,
    CONSTRAINT "creation_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "room" (
    "survey_id" uuid NOT NULL,
    "id" uuid NOT NULL,
    "storey_id" uuid NOT NULL,
    "name" text NOT NULL,
    "ring" jsonb NOT NULL,
    "holes" jsonb NOT NULL,
    "height_m" double precision,
    "use" text,
    "lining" jsonb NOT NULL,
    "protection" jsonb NOT NULL,
    "rating_min" double precision,
    "danger_of_activation" double precision,
    "measured_floor_area_m2" double precision,
    "compartment_floor_m2" double precision,
    "bounded_by_rated_construction" boolean,
    "roof_vents_m2" double precision NOT NULL,
    "roof_vents_state" text NOT NULL,
    "notes" text NOT NULL,
    "version" integer NOT NULL,
    CONSTRAINT "room_pk" PRIMARY KEY ("survey_id", "id")
  )`,
  `CREATE TABLE "entry" (
    "survey_id" uuid NOT NULL,
    "id" uuid NOT NULL,
    "room_id" uuid NOT NULL,
    "kind" text,
    "label" text NOT NULL,
    "count" double precision NOT NULL,
    "parts" jsonb NOT NULL,
    "x_m" double precision NOT NULL,
    "y_m" double precision NOT NULL,
    "rotation_deg" double precision NOT NULL,
    "base_height_m" double precision NOT NULL,
    "width_m" double precision NOT NULL,
    "depth_m" double precision NOT NULL,
    "height_m" double precision NOT NULL,
    "keeping" text NOT NULL,
    "enclosure" text NOT NULL,
    "sealed_rating_min" double precision,
    "evidence" text NOT NULL,
    "growth" text,
    "peak_kW" double precision,
    "curve" jsonb,
    "radiative_fraction" double precision,
    "ignition_class" text,
    "ignites_at_kW_m2" double precision,
    "note" text NOT NULL,
    "photos" jsonb NOT NULL,
    "recorded_by" text,
    "recorded_at" timestamptz,
    "confirmed_by" text,
    "confirmed_at" timestamptz,
    "version" integer NOT NULL,
    CONSTRAINT "entry_pk" PRIMARY KEY ("survey_id", "id")
  )`,
  `CREATE TABLE "export" (
    "id" uuid NOT NULL,
    "survey_id" uuid NOT NULL,
    "kind" text NOT NULL,
    "room_id" uuid,
    "units" text NOT NULL,
    "state" text NOT NULL,
    "progress" double precision NOT NULL,
    "file_key" text,
    "file_name" text,
    "bytes" integer,
    "problem" text,
    "person_id" uuid NOT NULL,
    "created_at" timestamptz NOT NULL,
    "updated_at" timestamptz NOT NULL,
    CONSTRAINT "export_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "known_device" (
    "token_hash" text NOT NULL,
    "person_id" uuid NOT NULL,
    "last_used_at" timestamptz NOT NULL,
    CONSTRAINT "known_device_pk" PRIMARY KEY ("token_hash", "person_id")
  )`,
  `CREATE TABLE "member" (
    "id" uuid NOT NULL,
    "person_id" uuid NOT NULL,
    "organisation_id" uuid NOT NULL,
    "role" text NOT NULL,
    "created_at" timestamptz NOT NULL,
    CONSTRAINT "member_person_organisation_unique" UNIQUE ("person_id", "organisation_id"),
    CONSTRAINT "member_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "opening" (
    "survey_id" uuid NOT NULL,
    "id" uuid NOT NULL,
    "storey_id" uuid NOT NULL,
    "wall" jsonb NOT NULL,
    "offset_m" double precision NOT NULL,
    "width_m" double precision NOT NULL,
    "height_m" double precision NOT NULL,
    "sill_m" double precision NOT NULL,
    "kind" text NOT NULL,
    "state" text NOT NULL,
    "label" text NOT NULL,
    "version" integer NOT NULL,
    CONSTRAINT "opening_pk" PRIMARY KEY ("survey_id", "id")
  )`,
  `CREATE TABLE "room_limit" (
    "id" uuid NOT NULL,
    "building_id" uuid NOT NULL,
    "room_id" uuid NOT NULL,
    "quantity" text NOT NULL,
    "bound" double precision NOT NULL,
    "source" text NOT NULL,
    "set_by" text NOT NULL,
    "since" date NOT NULL,
    "entered_by" uuid NOT NULL,
    "entered_at" timestamptz NOT NULL,
    "version" integer NOT NULL,
    CONSTRAINT "room_limit_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "room_summary" (
    "survey_id" uuid NOT NULL,
    "room_id" uuid NOT NULL,
    "floor_area_m2" double precision,
    "load_total_MJ" double precision,
    "load_per_floor_MJ_m2" double precision,
    "peak_kW" double precision,
    "flashover_time_s" double precision,
    "standing" text NOT NULL,
    "ratio" double precision,
    "entries" integer NOT NULL,
    "engine" text NOT NULL,
    "stale" boolean NOT NULL,
    "mark" integer NOT NULL,
    "computed_at" timestamptz,
    CONSTRAINT "room_summary_pk" PRIMARY KEY ("survey_id", "room_id")
  )`,
  `CREATE TABLE "session" (
    "token_hash" text NOT NULL,
    "person_id" uuid NOT NULL,
    "member_id" uuid NOT NULL,
    "created_at" timestamptz NOT NULL,
    "expires_at" timestamptz NOT NULL,
    CONSTRAINT "session_pk" PRIMARY KEY ("token_hash")
  )`,
  `CREATE TABLE "sign_in_attempt" (
    "id" uuid NOT NULL,
    "account_hash" text NOT NULL,
    "ip" text NOT NULL,
    "failed" boolean NOT NULL,
    "at" timestamptz NOT NULL,
    CONSTRAINT "sign_in_attempt_pk" PRIMARY KEY ("id")
  )`,
  `CREATE TABLE "site_role" (
    "id" uuid NOT NULL,
    "site_id" uuid NOT NULL,
    "member_id" uuid NOT NULL,
    "role" text NOT NULL,
    "given_at" timestamptz NOT NULL,
    CONSTRAINT "site_role_member_site_unique" UNIQUE ("member_id", "site_id"),
    CONSTRAINT "site_role_pk" PRIMARY KEY ("id")
  )`,
];

const INDEXES = [
  `CREATE INDEX "site_organisation" ON "site" ("organisation_id")`,
  `CREATE INDEX "building_site" ON "building" ("site_id")`,
  `CREATE UNIQUE INDEX "survey_one_working" ON "survey" ("building_id") WHERE "kind" = 'working'`,
  `CREATE INDEX "survey_building" ON "survey" ("building_id")`,
  `CREATE INDEX "change_set_person" ON "change_set" ("person_id")`,
  `CREATE INDEX "corner_storey" ON "corner" ("survey_id", "storey_id")`,
  `CREATE INDEX "creation_person" ON "creation" ("person_id")`,
  `CREATE INDEX "room_storey" ON "room" ("survey_id", "storey_id")`,
  `CREATE INDEX "entry_room" ON "entry" ("survey_id", "room_id")`,
  `CREATE INDEX "export_person" ON "export" ("person_id")`,
  `CREATE INDEX "export_survey" ON "export" ("survey_id")`,
  `CREATE INDEX "known_device_person" ON "known_device" ("person_id")`,
  `CREATE INDEX "member_organisation" ON "member" ("organisation_id")`,
  `CREATE INDEX "opening_storey" ON "opening" ("survey_id", "storey_id")`,
  `CREATE INDEX "room_limit_person" ON "room_limit" ("entered_by")`,
  `CREATE INDEX "room_limit_building_room" ON "room_limit" ("building_id", "room_id")`,
  `CREATE INDEX "room_summary_stale" ON "room_summary" ("survey_id") WHERE "stale"`,
  `CREATE INDEX "session_expires_at" ON "session" ("expires_at")`,
  `CREATE INDEX "session_member" ON "session" ("member_id")`,
  `CREATE INDEX "session_person" ON "session" ("person_id")`,
  `CREATE INDEX "sign_in_attempt_at" ON "sign_in_attempt" ("at")`,
  `CREATE INDEX "sign_in_attempt_ip" ON "sign_in_attempt" ("ip", "at")`,
  `CREATE INDEX "sign_in_attempt_account" ON "sign_in_attempt" ("account_hash", "at")`,
  `CREATE INDEX "site_role_site" ON "site_role" ("site_id")`,
];

const FOREIGN_KEYS = [
  `ALTER TABLE "site" ADD CONSTRAINT "site_organisation_fk" FOREIGN KEY ("organisation_id") REFERENCES "organisation"("id") ON DELETE RESTRICT`,
  `ALTER TABLE "building" ADD CONSTRAINT "building_site_fk" FOREIGN KEY ("site_id") REFERENCES "site"("id") ON DELETE CASCADE`,
  `ALTER TABLE "survey" ADD CONSTRAINT "survey_building_fk" FOREIGN KEY ("building_id") REFERENCES "building"("id") ON DELETE CASCADE`,
  `ALTER TABLE "change_set" ADD CONSTRAINT "change_set_survey_fk" FOREIGN KEY ("survey_id") REFERENCES "survey"("id") ON DELETE CASCADE`,
  `ALTER TABLE "change_set" ADD CONSTRAINT "change_set_person_fk" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE RESTRICT`,
  `ALTER TABLE "storey" ADD CONSTRAINT "storey_survey_fk" FOREIGN KEY ("survey_id") REFERENCES "survey"("id") ON DELETE CASCADE`,
  `ALTER TABLE "corner" ADD CONSTRAINT "corner_storey_fk" FOREIGN KEY ("survey_id", "storey_id") REFERENCES "storey"("survey_id","id") ON DELETE CASCADE`,
  `ALTER TABLE "creation" ADD CONSTRAINT "creation_person_fk" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE CASCADE`,
  `ALTER TABLE "room" ADD CONSTRAINT "room_storey_fk" FOREIGN KEY ("survey_id", "storey_id") REFERENCES "storey"("survey_id","id") ON DELETE CASCADE`,
  `ALTER TABLE "entry" ADD CONSTRAINT "entry_room_fk" FOREIGN KEY ("survey_id", "room_id") REFERENCES "room"("survey_id","id") ON DELETE CASCADE`,
  `ALTER TABLE "export" ADD CONSTRAINT "export_survey_fk" FOREIGN KEY ("survey_id") REFERENCES "survey"("id") ON DELETE CASCADE`,
  `ALTER TABLE "export" ADD CONSTRAINT "export_person_fk" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE RESTRICT`,
  `ALTER TABLE "known_device" ADD CONSTRAINT "known_device_person_fk" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE CASCADE`,
  `ALTER TABLE "member" ADD CONSTRAINT "member_person_fk" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE RESTRICT`,
  `ALTER TABLE "member" ADD CONSTRAINT "member_organisation_fk" FOREIGN KEY ("organisation_id") REFERENCES "organisation"("id") ON DELETE RESTRICT`,
  `ALTER TABLE "opening" ADD CONSTRAINT "opening_storey_fk" FOREIGN KEY ("survey_id", "storey_id") REFERENCES "storey"("survey_id","id") ON DELETE CASCADE`,
  `ALTER TABLE "room_limit" ADD CONSTRAINT "room_limit_building_fk" FOREIGN KEY ("building_id") REFERENCES "building"("id") ON DELETE CASCADE`,
  `ALTER TABLE "room_limit" ADD CONSTRAINT "room_limit_person_fk" FOREIGN KEY ("entered_by") REFERENCES "person"("id") ON DELETE RESTRICT`,
  `ALTER TABLE "room_summary" ADD CONSTRAINT "room_summary_room_fk" FOREIGN KEY ("survey_id", "room_id") REFERENCES "room"("survey_id","id") ON DELETE CASCADE`,
  `ALTER TABLE "session" ADD CONSTRAINT "session_person_fk" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE CASCADE`,
  `ALTER TABLE "session" ADD CONSTRAINT "session_member_fk" FOREIGN KEY ("member_id") REFERENCES "member"("id") ON DELETE CASCADE`,
  `ALTER TABLE "site_role" ADD CONSTRAINT "site_role_site_fk" FOREIGN KEY ("site_id") REFERENCES "site"("id") ON DELETE CASCADE`,
  `ALTER TABLE "site_role" ADD CONSTRAINT "site_role_member_fk" FOREIGN KEY ("member_id") REFERENCES "member"("id") ON DELETE CASCADE`,
];

/** History is added to, never rewritten, by whatever role: the chain of hashes shows it, this refuses it. */
const HISTORY_STAYS = [
  `CREATE FUNCTION "refuse_to_rewrite_history"() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    RAISE EXCEPTION 'rows of % are never changed or deleted', TG_TABLE_NAME USING ERRCODE = 'integrity_constraint_violation';
  END $$`,
  `CREATE TRIGGER "audit_event_stays" BEFORE UPDATE OR DELETE ON "audit_event"
  FOR EACH ROW EXECUTE FUNCTION "refuse_to_rewrite_history"()`,
  `CREATE TRIGGER "audit_event_is_not_emptied" BEFORE TRUNCATE ON "audit_event"
  FOR EACH STATEMENT EXECUTE FUNCTION "refuse_to_rewrite_history"()`,
];

export class FirstTables1764547200000 implements MigrationInterface {
  readonly name = 'FirstTables1764547200000';

  async up(runner: QueryRunner): Promise<void> {
    for (const statement of [...TABLES, ...INDEXES, ...FOREIGN_KEYS, ...HISTORY_STAYS]) await runner.query(statement);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const statement of [...TABLES].reverse()) {
      const table = /^CREATE TABLE "(\w+)"/.exec(statement)?.[1];
      if (table !== undefined) await runner.query(`DROP TABLE "${table}" CASCADE`);
    }
    await runner.query('DROP FUNCTION "refuse_to_rewrite_history"()');
  }
}
