/** What the server answered instead of a result. */
export class ApiError extends Error {
  constructor(
    readonly status: number,
    readonly problem: ApiProblem,
  ) {
    super(problem.title);
  }
}

export interface ApiProblem {
  type: string;
  title: string;
  status: number;
  detail?: string;
  problems?: { path: string; message: string; value?: unknown; range?: string; unit?: string }[];
  current?: unknown;
}

const unreachable: ApiProblem = {
  type: '/problems/unreachable',
  title: 'The server cannot be reached.',
  status: 0,
  detail: 'What you typed is kept here. Try again when the server answers.',
};

async function answer<T>(sending: Promise<Response>): Promise<T> {
  let response: Response;
  try {
    response = await sending;
  } catch {
    throw new ApiError(0, unreachable);
  }
  if (response.status === 204) return undefined as T;
  const type = response.headers.get('content-type') ?? '';
  const body: unknown = type.includes('json') ? await response.json() : undefined;
  if (response.ok) return body as T;
  throw new ApiError(
    response.status,
    (body as ApiProblem | undefined) ?? {
      ...unreachable,
      title: 'The server did not answer as it should.',
      status: response.status,
    },
  );
}

export function apiGet<T>(path: string): Promise<T> {
  return answer<T>(fetch(path, { headers: { accept: 'application/json' } }));
}

export function apiSend<T>(method: 'POST' | 'PATCH' | 'DELETE', path: string, body?: unknown): Promise<T> {
  return answer<T>(
    fetch(path, {
      method,
      headers: body === undefined ? {} : { 'content-type': 'application/json' },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    }),
  );
}
