import { z } from 'zod';

/** The environment, read and checked once. What is missing is said in one sentence, before anything is served. */
const integer = (fallback: number) => z.coerce.number().int().positive().default(fallback);

const schema = z.object({
  DATABASE_URL: z.string().startsWith('postgres', 'must be the postgres:// address of the app role'),
  DATABASE_AUTH_URL: z.string().startsWith('postgres', 'must be the postgres:// address of the auth role'),
  NEXTAUTH_URL: z.url('must be the address that people open, such as https://garden.example'),
  NEXTAUTH_SECRET: z.string().min(32, 'must be at least 32 random characters'),
  /** Comma-separated addresses of proxies whose X-Forwarded-For is believed. */
  TRUSTED_PROXIES: z.string().default(''),
  SIGN_IN_ATTEMPTS: integer(10),
  SIGN_IN_WINDOW_MINUTES: integer(15),
  SIGN_UPS_PER_HOUR: integer(20),
  DATABASE_POOL_SIZE: integer(5),
});

export type Env = z.infer<typeof schema>;

let checked: Env | undefined;

export function env(): Env {
  if (checked) return checked;
  const result = schema.safeParse(process.env);
  if (!result.success) {
    const lines = result.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`The environment is not complete. See .env.example.\n${lines.join('\n')}`);
  }
  checked = result.data;
  return checked;
}

/** Forgets what was read, for a test that changes the environment. */
export function resetEnv(): void {
  checked = undefined;
}
