import type { Logger } from 'pino';
import type { Database } from '../repositories/database.ts';
import type { PasswordHashes } from '../auth/password-hashes.ts';
import type { Sessions } from '../auth/sessions.ts';
import { SignInThrottle } from '../auth/sign-in-throttle.ts';
import type { Clock } from '../clock.ts';
import type { FileStore } from '../files/file-store.ts';
import type { Jobs } from '../jobs/jobs.ts';
import { AccessService } from './access-service.ts';
import { AccountService } from './account-service.ts';
import { BuildingService } from './building-service.ts';
import { ChangeSetService } from './change-set-service.ts';
import type { EstimateMaker } from './estimate-maker.ts';
import { EstimateService } from './estimate-service.ts';
import { ExportService } from './export-service.ts';
import { FileService } from './file-service.ts';
import { HealthService } from './health-service.ts';
import { HistoryService } from './history-service.ts';
import { LimitService } from './limit-service.ts';
import { MaterialService } from './material-service.ts';
import { OwnMaterialService } from './own-material-service.ts';
import type { ReportMaker } from './report-maker.ts';
import { SiteRoleService } from './site-role-service.ts';
import { SiteService } from './site-service.ts';
import { SummaryService } from './summary-service.ts';
import { SurveyService } from './survey-service.ts';
import { VersionStateService } from './version-state-service.ts';

export interface ServiceParts {
  readonly database: Database;
  readonly clock: Clock;
  readonly log: Logger;
  readonly sessions: Sessions;
  readonly hashes: PasswordHashes;
  readonly files: FileStore;
  /** Most bytes the files of one organisation may take together. */
  readonly fileQuota_bytes: number;
  readonly jobs: Jobs;
  readonly makeReport: ReportMaker;
  readonly makeEstimate: EstimateMaker;
}

export interface Services {
  readonly access: AccessService;
  readonly accounts: AccountService;
  readonly sites: SiteService;
  readonly siteRoles: SiteRoleService;
  readonly buildings: BuildingService;
  readonly limits: LimitService;
  readonly surveys: SurveyService;
  readonly changeSets: ChangeSetService;
  readonly summaries: SummaryService;
  readonly exports: ExportService;
  readonly estimates: EstimateService;
  readonly files: FileService;
  readonly materials: MaterialService;
  readonly ownMaterials: OwnMaterialService;
  readonly versionStates: VersionStateService;
  readonly history: HistoryService;
  readonly health: HealthService;
  readonly throttle: SignInThrottle;
}

/** Every use case, put together once. */
export function services(parts: ServiceParts): Services {
  const { database, clock } = parts;
  const access = new AccessService(database, clock);
  const throttle = new SignInThrottle(database, clock);
  const summaries = new SummaryService(parts);
  const ownMaterials = new OwnMaterialService(database, clock, access);
  return {
    access,
    throttle,
    summaries,
    accounts: new AccountService({ ...parts, throttle }),
    sites: new SiteService(database, clock),
    siteRoles: new SiteRoleService(database, clock),
    buildings: new BuildingService(database, clock),
    limits: new LimitService({ database, clock, access, summaries }),
    surveys: new SurveyService(database),
    changeSets: new ChangeSetService({ database, clock, summaries }),
    exports: new ExportService(parts),
    estimates: new EstimateService(parts.makeEstimate),
    files: new FileService(parts),
    materials: new MaterialService(database),
    ownMaterials,
    versionStates: new VersionStateService({ clock, ownMaterials }),
    history: new HistoryService(database),
    health: new HealthService(database),
  };
}
