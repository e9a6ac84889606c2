import { z } from 'zod';

const Environment = z.object({
  DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/, error: 'DATABASE_URL must be a postgres:// address' }),
  NEXTAUTH_URL: z.url().default('http://localhost:3000'),
  NEXTAUTH_SECRET: z.string().min(16, 'NEXTAUTH_SECRET must have at least 16 characters').optional(),
  NODE_ENV: z.enum(['development', 'test', 'production']).default('development'),
  /** An XYZ address such as https://…/{z}/{x}/{y}.png; without one the map draws the roads alone. */
  TILE_URL: z.string().optional(),
  TILE_ATTRIBUTION: z.string().default(''),
  /** Lines about slow or failed work go to standard output at this level. */
  LOG_LEVEL: z.enum(['silent', 'error', 'info']).default('info'),
});

export type Environment = z.infer<typeof Environment>;

let parsed: Environment | undefined;

/** The only reader of `process.env`: parsed once, everything wrong listed at once. */
export function env(): Environment {
  if (parsed) return parsed;
  const result = Environment.safeParse(process.env);
  if (!result.success) {
    const lines = result.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`The environment is not usable:\n${lines.join('\n')}`);
  }
  parsed = result.data;
  return parsed;
}

/** Tests point the process at their own database after modules have loaded. */
export function resetEnv(): void {
  parsed = undefined;
}

/** Signs the sessions. Scripts that never see a session run without it; a server in production does not. */
export function sessionSecret(): string | undefined {
  const { NEXTAUTH_SECRET, NODE_ENV } = env();
  if (NODE_ENV === 'production' && NEXTAUTH_SECRET === undefined)
    throw new Error('NEXTAUTH_SECRET must be set in production: it signs the sessions.');
  return NEXTAUTH_SECRET;
}
