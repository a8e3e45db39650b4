import { z } from 'zod';

const schema = z.object({
  PORT: z.coerce.number().int().min(0).max(65_535).default(4300),
  HOST: z.string().min(1).default('127.0.0.1'),
  DATABASE_URL: z
    .string()
    .regex(/^(sqlite:.+|postgres(ql)?:\/\/.+)$/, 'expected sqlite:PATH or postgres://...')
    .default('sqlite:data/groundward.sqlite'),
  SESSION_SECRET: z.string().min(16, 'expected at least 16 characters'),
  PUBLIC_URL: z.url().optional(),
  DEMO: z.enum(['', '0', '1']).default(''),
  DEMO_PASSWORD: z.string().min(8).default('groundward-demo'),
  LOG_LEVEL: z.enum(['debug', 'info', 'warn', 'error', 'silent']).default('info'),
});

export interface Environment {
  readonly port: number;
  readonly host: string;
  readonly databaseUrl: string;
  readonly sessionSecret: string;
  readonly overTls: boolean;
  /** null: no demo */
  readonly demoPassword: string | null;
  readonly logLevel: string;
}

/** The environment, read once; refuses to start where something is missing, naming the variable and never its value. */
export function readEnvironment(variables: Readonly<Record<string, string | undefined>>): Environment {
  const given = Object.fromEntries(
    Object.entries(variables).filter(([, value]) => value !== undefined && value !== ''),
  );
  const read = schema.safeParse(given);
  if (!read.success) {
    const lines = read.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`The server does not start. ${lines.join('; ')}`);
  }
  const { data } = read;
  return {
    port: data.PORT,
    host: data.HOST,
    databaseUrl: data.DATABASE_URL,
    sessionSecret: data.SESSION_SECRET,
    overTls: data.PUBLIC_URL?.startsWith('https:') ?? false,
    demoPassword: data.DEMO === '1' ? data.DEMO_PASSWORD : null,
    logLevel: data.LOG_LEVEL,
  };
}
