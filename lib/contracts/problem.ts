import { z } from "zod";

/** Every way a request can fail; the status follows from the kind. RFC 9457 `application/problem+json`. */
export const problemKinds = {
  "malformed-request": { status: 400, title: "The request could not be read" },
  "not-signed-in": { status: 401, title: "Sign in first" },
  locked: { status: 401, title: "Locked after 15 minutes without action" },
  forbidden: { status: 403, title: "Your role may not do this" },
  "not-found": { status: 404, title: "Not found" },
  conflict: { status: 409, title: "Something changed meanwhile" },
  "payload-too-large": { status: 413, title: "The request is too large" },
  "unsupported-media-type": { status: 415, title: "Send JSON" },
  "validation-failed": { status: 422, title: "Some values cannot be accepted" },
  "slow-down": { status: 429, title: "Too many tries in a row" },
  internal: { status: 500, title: "Something went wrong on the server" },
  "not-ready": { status: 503, title: "Not ready" },
} as const;

export type ProblemKind = keyof typeof problemKinds;

export const issueSchema = z.object({ path: z.string(), message: z.string() });

export type Issue = z.infer<typeof issueSchema>;

/** A field that someone else charted meanwhile: yours, what your form showed, and what stands now. */
export const fieldConflictSchema = z.object({
  field: z.string(),
  yours: z.union([z.number(), z.string(), z.null()]),
  basedOn: z.union([z.number(), z.string(), z.null()]),
  inForce: z
    .object({
      value: z.union([z.number(), z.string(), z.null()]),
      entryId: z.string(),
      chartedAt: z.string(),
      author: z.object({ id: z.string(), name: z.string() }),
    })
    .nullable(),
});

export type FieldConflict = z.infer<typeof fieldConflictSchema>;

export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  errors: z.array(issueSchema),
  conflict: z.array(fieldConflictSchema).optional(),
});

export type Problem = z.infer<typeof problemSchema>;

interface AppErrorExtras {
  errors?: Issue[];
  conflict?: FieldConflict[];
  headers?: Record<string, string>;
  cause?: unknown;
}

/** The one error a use case throws; the client rebuilds the same class from the problem it receives. */
export class AppError extends Error {
  readonly kind: ProblemKind;
  readonly errors: Issue[];
  readonly conflict: FieldConflict[] | undefined;
  readonly headers: Record<string, string>;

  constructor(kind: ProblemKind, detail: string, extras: AppErrorExtras = {}) {
    super(detail, { cause: extras.cause });
    this.name = "AppError";
    this.kind = kind;
    this.errors = extras.errors ?? [];
    this.conflict = extras.conflict;
    this.headers = extras.headers ?? {};
  }

  get status(): number {
    return problemKinds[this.kind].status;
  }

  toProblem(): Problem {
    const { status, title } = problemKinds[this.kind];
    return {
      type: `/problems/${this.kind}`,
      title,
      status,
      detail: this.message,
      errors: this.errors,
      ...(this.conflict && { conflict: this.conflict }),
    };
  }

  static fromProblem(problem: Problem, headers: Record<string, string> = {}): AppError {
    const name = problem.type.split("/").at(-1) ?? "";
    const kind = name in problemKinds ? (name as ProblemKind) : "internal";
    return new AppError(kind, problem.detail, { errors: problem.errors, conflict: problem.conflict, headers });
  }
}
