import { type z } from 'zod';
import { type Contract, type ParamsOf, type ResponseOf } from '../../shared/api/contract';
import { ApiProblem, NoSignal, problemFrom } from './problems';

type AnyContract = Contract<z.ZodType, z.ZodType, z.ZodType, z.ZodType>;
type InputOf<T> = T extends z.ZodUndefined ? undefined : T extends z.ZodType ? z.input<T> : never;
type BodyIn<C> = C extends Contract<z.ZodType, z.ZodType, infer B, z.ZodType> ? InputOf<B> : never;
type QueryIn<C> = C extends Contract<z.ZodType, infer Q, z.ZodType, z.ZodType> ? InputOf<Q> : never;
type Given<K extends string, T> = [T] extends [undefined]
  ? { [P in K]?: undefined }
  : { [P in K]: T };

/** What a call needs, taken from its contract; a query may be left out. */
export type CallInput<C> = Given<'params', ParamsOf<C>> &
  Given<'body', BodyIn<C>> & { query?: Partial<NonNullable<QueryIn<C>>>; signal?: AbortSignal };

/** The address of a contract with its parameters and query filled in. */
export function addressOf(contract: AnyContract, params?: unknown, query?: unknown): string {
  const given = (params ?? {}) as Record<string, string>;
  const path = contract.path.replace(/:(\w+)/g, (_, name: string) =>
    encodeURIComponent(given[name] ?? ''),
  );
  const search = new URLSearchParams();
  const asked = (query ?? {}) as Record<string, string | number | undefined | null>;
  for (const [key, value] of Object.entries(asked)) {
    if (value !== undefined && value !== '' && value !== null) search.set(key, String(value));
  }
  const text = search.toString();
  return `/api${path}${text ? `?${text}` : ''}`;
}

async function readBody(response: Response): Promise<unknown> {
  try {
    return await response.json();
  } catch {
    return undefined;
  }
}

/**
 * Calls one route. Throws `NoSignal` when no answer came and `ApiProblem` when the server said no.
 * The answer is trusted as the contract's shape: the server checks it on its way out.
 */
export async function call<C extends AnyContract>(
  contract: C,
  input: CallInput<C>,
): Promise<ResponseOf<C>> {
  const { params, query, body, signal } = input as {
    params?: unknown;
    query?: unknown;
    body?: unknown;
    signal?: AbortSignal;
  };
  let response: Response;
  try {
    response = await fetch(addressOf(contract, params, query), {
      method: contract.method,
      credentials: 'same-origin',
      headers: {
        Accept: 'application/json',
        'X-Scantling': '1',
        ...(body === undefined ? {} : { 'Content-Type': 'application/json' }),
      },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
      ...(signal ? { signal } : {}),
    });
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw new NoSignal();
  }
  if (response.status === 204) return undefined as ResponseOf<C>;
  const answer = await readBody(response);
  if (!response.ok) throw problemFrom(response.status, answer);
  if (answer === undefined) throw problemFrom(502, undefined);
  return answer as ResponseOf<C>;
}

export interface UploadOptions {
  onProgress?: (sent: number, total: number) => void;
  signal?: AbortSignal;
}

/** Sends one file with progress (fetch cannot tell how much has gone up, XMLHttpRequest can). */
export function upload<C extends AnyContract>(
  contract: C,
  file: File,
  options: UploadOptions = {},
): Promise<ResponseOf<C>> {
  const spec = contract.upload;
  if (!spec) throw new Error(`${contract.id} takes no file`);
  if (file.size > spec.maxBytes) {
    const limit = Math.floor(spec.maxBytes / (1024 * 1024));
    return Promise.reject(
      new ApiProblem({
        type: 'about:blank',
        title: 'The file is too large',
        status: 413,
        code: 'uploads/too-large',
        detail: `The file is over ${limit} MB and was not sent. Nothing else changed; choose a smaller one.`,
      }),
    );
  }
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open(contract.method, addressOf(contract));
    request.responseType = 'json';
    request.setRequestHeader('X-Scantling', '1');
    request.upload.onprogress = (e) => options.onProgress?.(e.loaded, e.total);
    request.onerror = () => reject(new NoSignal());
    request.onabort = () => reject(new DOMException('Stopped', 'AbortError'));
    request.onload = () => {
      if (request.status >= 200 && request.status < 300) resolve(request.response as ResponseOf<C>);
      else reject(problemFrom(request.status, request.response));
    };
    options.signal?.addEventListener('abort', () => request.abort());
    const form = new FormData();
    form.append(spec.field, file, file.name);
    request.send(form);
  });
}

/** The text of a file such as captions; null when it does not come. */
export async function loadText(address: string): Promise<string | null> {
  try {
    const response = await fetch(address, { credentials: 'same-origin' });
    return response.ok ? await response.text() : null;
  } catch {
    return null;
  }
}
