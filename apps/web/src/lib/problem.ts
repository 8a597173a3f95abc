import { PROBLEMS, problemDetail, type ProblemCode, type ProblemDetail } from "@cleatwork/contracts";

export type FieldProblem = NonNullable<ProblemDetail["errors"]>[number];

/** What the API answered instead of what was asked. */
export class HttpProblem extends Error {
  readonly code: ProblemCode;
  readonly status: number;
  readonly title: string;
  readonly detail: string;
  /** The request's name in the logs, to read out to whoever helps. */
  readonly request: string;
  readonly errors: readonly FieldProblem[];

  constructor(detail: ProblemDetail) {
    super(detail.detail || detail.title);
    this.name = "HttpProblem";
    this.code = codeOf(detail.type);
    this.status = detail.status;
    this.title = detail.title;
    this.detail = detail.detail;
    this.request = detail.instance.replace(/^\/requests\//, "");
    this.errors = detail.errors ?? [];
  }
}

/** No answer came: offline, the server away, the request cut. Whether it was carried out is unknown. */
export class NetworkProblem extends Error {
  constructor(options?: ErrorOptions) {
    super("There is no connection to Cleatwork right now.", options);
    this.name = "NetworkProblem";
  }
}

/** The answer came, and is not what the contract says: the two sides are of different ages. */
export class AnswerProblem extends Error {
  constructor(endpoint: string, options?: ErrorOptions) {
    super(`The answer to ${endpoint} is not readable. Load the page again.`, options);
    this.name = "AnswerProblem";
  }
}

/** The address cannot be one of ours, or what it names is not for this person. */
export class NotFoundProblem extends Error {
  constructor() {
    super("There is nothing at this address.");
    this.name = "NotFoundProblem";
  }
}

export const isProblem = <C extends ProblemCode>(error: unknown, ...codes: C[]): error is HttpProblem & { code: C } =>
  error instanceof HttpProblem && (codes as ProblemCode[]).includes(error.code);

function codeOf(type: string): ProblemCode {
  const code = type.replace(/^\/problems\//, "");
  return Object.hasOwn(PROBLEMS, code) ? (code as ProblemCode) : "went-wrong";
}

export async function problemFrom(response: Response): Promise<HttpProblem> {
  const parsed = problemDetail.safeParse(await response.json().catch(() => null));
  if (parsed.success) return new HttpProblem(parsed.data);
  return new HttpProblem({
    type: "/problems/went-wrong",
    title: PROBLEMS["went-wrong"].title,
    status: response.status,
    detail: `The server answered ${response.status} and nothing more.`,
    instance: response.headers.get("x-request-id") ?? "",
  });
}
