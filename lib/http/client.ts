import type { Problem } from './problem';

/** A refusal as the browser sees it; the message is ready to be shown. */
export class ProblemError extends Error {
  override readonly name = 'ProblemError';
  constructor(readonly problem: Problem) {
    super(problem.detail);
  }
}

const lost: Problem = {
  type: 'about:blank', title: 'No connection', status: 0, code: 'unavailable',
  detail: 'Tamis cannot be reached. Nothing was saved and nothing you typed is lost. Check the network, then try again.',
};

export const isLostConnection = (error: unknown): boolean => error instanceof ProblemError && error.problem.status === 0;

export type SendOptions = {
  readonly body?: unknown;
  /** Bytes as they are, in place of JSON. */
  readonly file?: Blob;
  /** The version the change was made from; sent as If-Match. */
  readonly version?: number;
  readonly signal?: AbortSignal;
};

/** Sends JSON and gives the answer, or throws a `ProblemError` with a sentence for every failure there is. */
export const send = async <Answer>(method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE', url: string, { body, file, version, signal }: SendOptions = {}): Promise<Answer> => {
  let response: Response;
  try {
    response = await fetch(url, {
      method,
      headers: {
        Accept: 'application/json',
        ...(method === 'GET' ? {} : { 'Content-Type': file === undefined ? 'application/json' : 'application/octet-stream' }),
        ...(version === undefined ? {} : { 'If-Match': `"${version}"` }),
      },
      ...(method === 'GET' ? {} : { body: file ?? JSON.stringify(body ?? {}) }),
      ...(signal === undefined ? {} : { signal }),
    });
  } catch (error) {
    if (signal?.aborted === true) throw error;
    throw new ProblemError(lost);
  }
  const answer: unknown = await response.json().catch(() => null);
  if (response.ok) return answer as Answer;
  throw new ProblemError(isProblem(answer) ? answer : {
    ...lost, status: response.status, detail: 'Tamis answered in a way that cannot be read. Nothing you typed is lost. Reload the page, then try again.',
  });
};

const isProblem = (value: unknown): value is Problem => typeof value === 'object' && value !== null && 'detail' in value && 'code' in value;
