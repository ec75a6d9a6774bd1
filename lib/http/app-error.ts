/** One thing that is wrong with what was sent. */
export interface Problem {
  /** Where, as `plan.tiers[0].topHeightM`. */
  path: string;
  message: string;
  value?: unknown;
  range?: string | undefined;
  unit?: string | undefined;
}

interface AppErrorOptions {
  status: number;
  code: string;
  title: string;
  detail?: string;
  problems?: Problem[];
  /** The row as it stands, for a clash of two edits. */
  current?: unknown;
  retryAfterS?: number;
}

/** An answer that is not success, said so that a person knows what to do. Becomes problem+json (RFC 9457). */
export class AppError extends Error {
  readonly status: number;
  readonly code: string;
  readonly title: string;
  readonly detail: string | undefined;
  readonly problems: Problem[] | undefined;
  readonly current: unknown;
  readonly retryAfterS: number | undefined;

  constructor({ status, code, title, detail, problems, current, retryAfterS }: AppErrorOptions) {
    super(title);
    this.status = status;
    this.code = code;
    this.title = title;
    this.detail = detail;
    this.problems = problems;
    this.current = current;
    this.retryAfterS = retryAfterS;
  }
}

export const notSignedIn = () =>
  new AppError({
    status: 401,
    code: 'not-signed-in',
    title: 'You are not signed in.',
    detail: 'Sign in and try again.',
  });

export const notFoundHere = (noun = 'page') =>
  new AppError({
    status: 404,
    code: 'not-found',
    title: `There is no such ${noun} here.`,
    detail: 'It may have been deleted, or you may have no part in its garden.',
  });

export const notAllowed = (says: string) =>
  new AppError({
    status: 403,
    code: 'not-allowed',
    title: 'Your role does not allow this.',
    detail: `“${says}” is for other roles. Ask an owner of the garden.`,
  });

export const invalid = (problems: Problem[], title = 'Something in this does not fit.') =>
  new AppError({
    status: 422,
    code: 'invalid',
    title,
    detail: problems[0]
      ? `${problems[0].path ? `${problems[0].path}: ` : ''}${problems[0].message}`
      : 'Nothing was saved.',
    problems,
  });

export const clash = (current: unknown) =>
  new AppError({
    status: 409,
    code: 'clash',
    title: 'Somebody else changed this first.',
    detail: 'Nothing was overwritten. Look at both and choose.',
    current,
  });

export const inUse = (detail: string) =>
  new AppError({ status: 409, code: 'in-use', title: 'It is still in use.', detail });
