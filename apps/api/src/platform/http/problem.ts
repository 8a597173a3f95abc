import { PROBLEMS, type ProblemCode, type ProblemDetail } from "@cleatwork/contracts";

export type ProblemErrors = NonNullable<ProblemDetail["errors"]>;

/** A refusal that the caller is told of, as RFC 9457 says it. */
export class HttpProblem extends Error {
  constructor(
    readonly code: ProblemCode,
    detail: string,
    readonly errors?: ProblemErrors,
  ) {
    super(detail);
  }

  get status(): number {
    return PROBLEMS[this.code].status;
  }

  toDetail(requestId: string): ProblemDetail {
    return {
      type: `/problems/${this.code}`,
      title: PROBLEMS[this.code].title,
      status: this.status,
      detail: this.message,
      instance: `/requests/${requestId}`,
      ...(this.errors ? { errors: this.errors } : {}),
    };
  }
}

export const problem = (code: ProblemCode, detail: string, errors?: ProblemErrors): HttpProblem =>
  new HttpProblem(code, detail, errors);
