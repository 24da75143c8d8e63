import { type Issue, type Problem } from '../../shared/api/problem';

/** The catalogue: stable code → status and title. Details are given where an error is thrown. */
export const catalogue = {
  'request/invalid': [422, 'Some of that is not right'],
  'request/malformed': [400, 'The request could not be read'],
  'request/too-large': [413, 'That is too large'],
  'request/cross-site': [403, 'The request came from somewhere else'],
  'request/too-many': [429, 'Too many at once'],
  'auth/needed': [401, 'Sign in first'],
  'auth/wrong': [401, 'That e-mail and password don’t go together'],
  'auth/suspended': [403, 'This account is suspended'],
  'auth/not-allowed': [403, 'Not allowed'],
  'auth/unconfirmed': [403, 'Confirm your e-mail first'],
  'auth/token': [422, 'That link no longer works'],
  'thing/missing': [404, 'Not found'],
  'thing/exists': [409, 'That exists already'],
  'drafts/stale-version': [409, 'Another window saved first'],
  'drafts/published': [409, 'A published plan cannot be thrown away'],
  'plans/check-sheet': [422, 'The check sheet fails'],
  'bench/entry-differs': [409, 'That entry is already there with other content'],
  'bench/older': [409, 'That revision is an older one'],
  'bench/full': [409, 'The bench copy is full'],
  'shop-card/stale-version': [409, 'Another device saved first'],
  'uploads/type': [422, 'That is not the kind of file we take here'],
  'uploads/empty': [422, 'The file is empty'],
  'uploads/unreadable': [422, 'The file could not be read'],
  'uploads/missing': [422, 'No file came'],
  'uploads/quota': [409, 'Your room is full'],
  'uploads/incomplete': [409, 'Some parts are missing'],
  'uploads/closed': [409, 'That upload is over'],
  'talk/anchor': [422, 'That place is not in the plan'],
  'cases/taken': [409, 'Somebody is already on this case'],
  'cases/ruled': [409, 'This case is already ruled'],
  'cases/own': [403, 'You cannot rule on your own'],
  'server/broke': [500, 'Something broke here'],
} as const satisfies Record<string, readonly [number, string]>;
export type ErrorCode = keyof typeof catalogue;

export interface ErrorExtras {
  issues?: Issue[];
  meta?: Record<string, unknown>;
  retryAfter?: number;
}

/** An answer that says no: what happened, what was kept, what to do. */
export class ApiError extends Error {
  readonly code: ErrorCode;
  readonly extras: ErrorExtras;
  constructor(code: ErrorCode, detail: string, extras: ErrorExtras = {}) {
    super(detail);
    this.name = 'ApiError';
    this.code = code;
    this.extras = extras;
  }
  get status(): number {
    return catalogue[this.code][0];
  }
  /** RFC 9457 problem details. */
  problem(instance?: string): Problem {
    const [status, title] = catalogue[this.code];
    return {
      type: 'about:blank',
      title,
      status,
      code: this.code,
      detail: this.message,
      ...(instance ? { instance } : {}),
      ...this.extras,
    };
  }
}

export const missing = (what: string): ApiError =>
  new ApiError('thing/missing', `${what} is not here, or not for you. Nothing was changed.`);
export const notAllowed = (why: string): ApiError => new ApiError('auth/not-allowed', why);

/** A value the database already has: SQLSTATE 23505. */
export function uniqueViolation(error: unknown): boolean {
  const driver = (error as { driverError?: { code?: string } }).driverError;
  return driver?.code === '23505' || (error as { code?: string }).code === '23505';
}

/** A value PostgreSQL cannot read: a broken id (22P02) or a zero character (22021, 22P05). */
function unreadableValue(error: unknown): boolean {
  const driver = (error as { driverError?: { code?: string } }).driverError;
  return ['22P02', '22021', '22P05'].includes(driver?.code ?? '');
}

interface BodyError {
  type?: string;
  status?: number;
}

/** Turns anything thrown into an answer; null when it is a fault of ours to be logged. */
export function toApiError(error: unknown): ApiError | null {
  if (error instanceof ApiError) return error;
  if (uniqueViolation(error))
    return new ApiError(
      'thing/exists',
      'Something with that name or id is there already. Nothing was changed.',
    );
  if (unreadableValue(error)) {
    return new ApiError(
      'request/invalid',
      'A value could not be stored as it is. Nothing was changed; take out unusual characters.',
    );
  }
  const body = error as BodyError;
  if (body.type === 'entity.too.large')
    return new ApiError(
      'request/too-large',
      'That is more than we take at once. Nothing was changed; make it smaller.',
    );
  if (body.type === 'entity.parse.failed')
    return new ApiError('request/malformed', 'The body is not JSON. Nothing was changed.');
  if (
    error instanceof URIError ||
    (typeof body.status === 'number' && body.status >= 400 && body.status < 500)
  ) {
    return new ApiError(
      'request/malformed',
      'The address or the body could not be read. Nothing was changed.',
    );
  }
  return null;
}
