import { AuditChain } from './audit-chain.ts';
import { AuditEvent } from './audit-event.ts';
import { Building } from './building.ts';
import { ChangeSet } from './change-set.ts';
import { Corner } from './corner.ts';
import { Creation } from './creation.ts';
import { Entry } from './entry.ts';
import { Export } from './export.ts';
import { KnownDevice } from './known-device.ts';
import { Member } from './member.ts';
import { Opening } from './opening.ts';
import { Organisation } from './organisation.ts';
import { OwnMaterialEvidence } from './own-material-evidence.ts';
import { OwnMaterialVersion } from './own-material-version.ts';
import { OwnMaterial } from './own-material.ts';
import { Person } from './person.ts';
import { RoomLimit } from './room-limit.ts';
import { RoomSummary } from './room-summary.ts';
import { Room } from './room.ts';
import { Session } from './session.ts';
import { SignInAttempt } from './sign-in-attempt.ts';
import { SiteRole } from './site-role.ts';
import { Site } from './site.ts';
import { StoredFile } from './stored-file.ts';
import { Storey } from './storey.ts';
import { Survey } from './survey.ts';

/** Every entity, named one by one: a glob would depend on the tool that runs the code. */
export const ALL_ENTITIES = [
  AuditChain,
  AuditEvent,
  Building,
  ChangeSet,
  Corner,
  Creation,
  Entry,
  Export,
  KnownDevice,
  Member,
  Opening,
  Organisation,
  OwnMaterialEvidence,
  OwnMaterialVersion,
  OwnMaterial,
  Person,
  RoomLimit,
  RoomSummary,
  Room,
  Session,
  SignInAttempt,
  SiteRole,
  Site,
  StoredFile,
  Storey,
  Survey,
];
