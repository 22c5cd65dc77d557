import { fileURLToPath } from 'node:url';
import { z } from 'zod';

/** A reason not to start, in one sentence for the terminal. */
export class StartRefusal extends Error {
  override name = 'StartRefusal';
}

/** What an example's secret begins with, so that production can tell it from one of its own. */
const DEMO_SECRET = 'demo-';

const environmentSchema = z.object({
  DATABASE_URL: z.string().regex(/^(mariadb|mysql):\/\//),
  HOST: z.string().default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65_535).default(3000),
  NODE_ENV: z.enum(['development', 'test', 'production']).default('development'),
  STATIC_DIR: z.string().default(fileURLToPath(new URL('../../var/client', import.meta.url))),
  SESSION_SECRET: z.string().min(32),
  BOREWRIGHT_DEMO: z.enum(['0', '1']).optional(),
  BOREWRIGHT_REQUESTS_PER_MINUTE: z.coerce.number().int().min(1).default(3000),
  BOREWRIGHT_TRUSTED_PROXIES: z.coerce.number().int().min(0).max(10).default(0),
  BOREWRIGHT_LOG_LEVEL: z.enum(['debug', 'info', 'warn', 'error', 'silent']).default('warn'),
});

/** What the app needs to know of where it runs. */
export interface AppConfig {
  /** Folder of the built pages. */
  staticDir: string;
  sessionSecret: string;
  /** How many proxies in front may say who the client is. */
  trustedProxies: number;
  requestsPerMinute: number;
  signUpsPerHour: number;
  /** Work factor of bcrypt: each step doubles the time. */
  passwordRounds: number;
}

export interface Config {
  databaseUrl: string;
  host: string;
  port: number;
  loadDemo: boolean;
  logLevel: string;
  app: AppConfig;
}

export function readConfig(environment: NodeJS.ProcessEnv): Config {
  const parsed = environmentSchema.safeParse(environment);
  if (!parsed.success) {
    const names = [...new Set(parsed.error.issues.map((issue) => issue.path.join('.')))].join(', ');
    throw new StartRefusal(
      `Borewright cannot start: set ${names} as DEVELOPERS.md describes, or use npm start, which does it for you.`,
    );
  }
  const env = parsed.data;
  const production = env.NODE_ENV === 'production';
  if (production && env.SESSION_SECRET.startsWith(DEMO_SECRET)) {
    throw new StartRefusal(
      'Borewright cannot start in production with a demo secret: set SESSION_SECRET to 32 random characters or more of your own.',
    );
  }
  return {
    databaseUrl: env.DATABASE_URL,
    host: env.HOST,
    port: env.PORT,
    // The demo accounts have a known password: in production only on express wish.
    loadDemo: env.BOREWRIGHT_DEMO === undefined ? !production : env.BOREWRIGHT_DEMO === '1',
    logLevel: env.BOREWRIGHT_LOG_LEVEL,
    app: {
      staticDir: env.STATIC_DIR,
      sessionSecret: env.SESSION_SECRET,
      trustedProxies: env.BOREWRIGHT_TRUSTED_PROXIES,
      requestsPerMinute: env.BOREWRIGHT_REQUESTS_PER_MINUTE,
      signUpsPerHour: 60,
      passwordRounds: 11,
    },
  };
}
