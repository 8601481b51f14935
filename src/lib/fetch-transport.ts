import { AppError, errorStatus, type ErrorCode, type ProblemDetails } from '#contracts/errors.ts';
import type { Transport } from './transport.ts';

/** Fills `:name` parts of a path and adds the query. */
export function addressOf(path: string, params: unknown, query: unknown): string {
  const values = (params ?? {}) as Record<string, string | number>;
  const filled = path.replace(/:([A-Za-z]+)/g, (_, name: string) => encodeURIComponent(String(values[name] ?? '')));
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries((query ?? {}) as Record<string, string | number | undefined>)) {
    if (value !== undefined && value !== '') search.set(name, String(value));
  }
  const text = search.toString();
  return text === '' ? filled : `${filled}?${text}`;
}

function isProblem(value: unknown): value is ProblemDetails {
  return typeof value === 'object' && value !== null && 'code' in value && typeof value.code === 'string' && value.code in errorStatus;
}

/** Turns an answer that is not a success into the outcome it stands for. */
export function errorOf(status: number, body: unknown): AppError {
  if (isProblem(body)) return new AppError(body.code, body.detail, body.fields, body.newer);
  const code: ErrorCode = status === 413 ? 'too-large' : status === 429 ? 'too-many' : 'broken';
  return new AppError(code, status === 429 ? 'Too many tries. Wait a minute and try again.' : 'The server could not do that. Try again in a moment.');
}

function isJson(answer: Response): boolean {
  return (answer.headers.get('content-type') ?? '').includes('json');
}

export const fetchTransport: Transport = async (method, path, { params, query, body }) => {
  let answer: Response;
  let parsed: unknown;
  try {
    answer = await fetch(addressOf(path, params, query), {
      method,
      credentials: 'same-origin',
      headers: body === undefined ? { accept: 'application/json' } : { accept: 'application/json', 'content-type': 'application/json' },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
    // the connection can be lost while the answer comes, too
    const text = await answer.text();
    parsed = text !== '' && isJson(answer) ? JSON.parse(text) : null;
  } catch (cause) {
    throw new AppError('unreachable', `The server could not be reached (${cause instanceof Error ? cause.message : 'no answer'}). Check the connection and try again.`);
  }
  if (!answer.ok) throw errorOf(answer.status, parsed);
  return parsed;
};
