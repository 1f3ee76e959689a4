import { AppError } from "@/lib/contracts";

/** What a refused save says above the form. The fields say the rest. */
export function refusalWords(error: Error): string {
  if (!(error instanceof AppError)) return error.message;
  switch (error.kind) {
    case "locked":
    case "not-signed-in":
      return "Not saved yet. What you typed is kept: sign in, then save again.";
    case "validation-failed": {
      const others = error.errors.map(({ message }) => message);
      return `Not saved. ${[...new Set(others.length > 0 ? others : [error.message])].join(" ")}`;
    }
    default:
      return `Not saved. ${error.message}`;
  }
}
