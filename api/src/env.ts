import { join } from 'node:path';
import { z } from 'zod';

const isLoopback = (host: string): boolean => ['127.0.0.1', '::1', '[::1]', 'localhost'].includes(host);

const port = z.coerce.number().int().min(1).max(65_535);
const schema = z.object({
  NODE_ENV: z.enum(['production', 'development', 'test']).default('production'),
  PORT: port.default(3000),
  HOST: z.string().min(1).default('127.0.0.1'),
  BASE_URL: z.url({ protocol: /^https?$/ }).optional(),
  DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
  MIGRATION_DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }).optional(),
  DATA_DIR: z
    .string()
    .min(1)
    .default(join(import.meta.dirname, '..', '..', '.data')),
  DEMO: z.enum(['0', '1']).default('0'),
  LOG_LEVEL: z.enum(['silent', 'fatal', 'error', 'warn', 'info', 'debug', 'trace']).default('info'),
  WEB_DIST: z
    .string()
    .min(1)
    .default(join(import.meta.dirname, '..', '..', 'web', 'dist')),
  /** Proxies in front whose X-Forwarded-For is believed. */
  TRUST_PROXY: z.coerce.number().int().min(0).max(5).default(0),
  DATABASE_POOL: z.coerce.number().int().min(2).max(100).default(10),
  /** Cost of a password hash; never under the floor of 19 MiB and 2 passes. */
  HASH_MEMORY_KIB: z.coerce.number().int().min(19_456).max(1_048_576).default(65_536),
  HASH_PASSES: z.coerce.number().int().min(2).max(20).default(3),
  /** Most that the files of one organisation may take together, MB. */
  FILES_PER_ORGANISATION_MB: z.coerce.number().int().min(1).max(1_000_000).default(2048),
});

export interface Env {
  readonly mode: 'production' | 'development' | 'test';
  readonly port: number;
  readonly host: string;
  readonly baseUrl: URL;
  readonly databaseUrl: string;
  readonly migrationDatabaseUrl: string | null;
  readonly dataDir: string;
  readonly demo: boolean;
  readonly logLevel: z.infer<typeof schema>['LOG_LEVEL'];
  readonly webDist: string;
  readonly trustProxy: number;
  readonly databasePool: number;
  readonly hashMemory_KiB: number;
  readonly hashPasses: number;
  readonly filesPerOrganisation_bytes: number;
}

/** A setting that cannot be used: the message is one sentence for whoever starts the program. */
export class EnvError extends Error {}

/**
 * Reads the settings; the only reader of the environment.
 * @throws EnvError naming the first setting that is wrong, or a public address without https
 */
export function readEnv(source: Readonly<Record<string, string | undefined>>): Env {
  const parsed = schema.safeParse(source);
  if (!parsed.success) {
    const issue = parsed.error.issues[0];
    throw new EnvError(`The setting ${issue?.path.join('.') ?? '?'} cannot be used: ${issue?.message ?? 'unknown'}.`);
  }
  const env = parsed.data;
  const baseUrl = new URL(env.BASE_URL ?? `http://127.0.0.1:${env.PORT}`);
  if (!isLoopback(env.HOST) && (baseUrl.protocol !== 'https:' || env.BASE_URL === undefined)) {
    throw new EnvError(
      `HOST=${env.HOST} would be reachable from other machines, so BASE_URL must be the https address people use; without it passwords and sign-ins would travel in the open.`,
    );
  }
  if (!isLoopback(env.HOST) && env.NODE_ENV !== 'production') {
    throw new EnvError(`HOST=${env.HOST} would be reachable from other machines, so NODE_ENV must be production.`);
  }
  return {
    mode: env.NODE_ENV,
    port: env.PORT,
    host: env.HOST,
    baseUrl,
    databaseUrl: env.DATABASE_URL,
    migrationDatabaseUrl: env.MIGRATION_DATABASE_URL ?? null,
    dataDir: env.DATA_DIR,
    demo: env.DEMO === '1',
    logLevel: env.LOG_LEVEL,
    webDist: env.WEB_DIST,
    trustProxy: env.TRUST_PROXY,
    databasePool: env.DATABASE_POOL,
    hashMemory_KiB: env.HASH_MEMORY_KIB,
    hashPasses: env.HASH_PASSES,
    filesPerOrganisation_bytes: env.FILES_PER_ORGANISATION_MB * 1024 * 1024,
  };
}
