import { problemSchema, type Issue, type Problem } from '../../shared/api/problem';

/** The server answered and said no. Carries the whole problem: code, sentence, issues, meta. */
export class ApiProblem extends Error {
  readonly problem: Problem;
  constructor(problem: Problem) {
    super(problem.detail ?? problem.title);
    this.name = 'ApiProblem';
    this.problem = problem;
  }
  get status(): number {
    return this.problem.status;
  }
  get code(): string {
    return this.problem.code;
  }
  get issues(): readonly Issue[] {
    return this.problem.issues ?? [];
  }
}

/** The request never got an answer: no signal, the server is down, or the line broke in the middle. */
export class NoSignal extends Error {
  constructor() {
    super('No answer came. What you typed is still here; try again when the signal is back.');
    this.name = 'NoSignal';
  }
}

/** Worth another try later without anybody changing anything. */
export function passing(error: unknown): boolean {
  return (
    error instanceof NoSignal ||
    (error instanceof ApiProblem && (error.status >= 500 || error.status === 429))
  );
}

/** Reads a problem from an answer's body; an unreadable body still gives a clear one. */
export function problemFrom(status: number, body: unknown): ApiProblem {
  const parsed = problemSchema.safeParse(body);
  if (parsed.success) return new ApiProblem(parsed.data);
  return new ApiProblem({
    type: 'about:blank',
    title: 'The server could not answer',
    status,
    code: `http/${status}`,
    detail: 'The server gave an answer that makes no sense. Nothing was lost here; try again.',
  });
}

/** A sentence for the person, and the code for whoever is asked. */
export function tell(error: unknown): { text: string; code: string } {
  if (error instanceof ApiProblem) return { text: error.message, code: error.code };
  if (error instanceof NoSignal) return { text: error.message, code: 'signal/none' };
  return {
    text: 'Something broke on this page. What you typed is kept; load the page again.',
    code: 'page/broke',
  };
}
