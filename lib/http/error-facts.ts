interface ErrorFacts {
  name: string;
  message?: string;
  code?: string;
  constraint?: string;
  frames?: string;
  cause?: ErrorFacts;
}

/** A database error's message, SQL and parameters, and what the core refuses, can hold a name or a charted value. */
const withValues = /^Sequelize|^RangeError$/;

const text = (value: unknown): string | undefined => (typeof value === "string" ? value : undefined);

/** What a log line may say of an error: its kind, code, constraint and where it came from are enough to find it. */
export function errorFacts(error: unknown): ErrorFacts {
  if (!(error instanceof Error)) return { name: typeof error };
  const original =
    "original" in error ? (error.original as { code?: unknown; constraint?: unknown } | undefined) : null;
  return {
    name: error.name,
    message: withValues.test(error.name) ? undefined : error.message,
    code: text(original?.code),
    constraint: text(original?.constraint),
    frames: error.stack
      ?.split("\n")
      .filter((row) => row.startsWith("    at "))
      .join("\n"),
    cause: error.cause === undefined ? undefined : errorFacts(error.cause),
  };
}
