/** The server did what was asked, but its answer is not by the contract: sending it again would not help. */
export class UnreadableAnswerError extends Error {
  constructor(cause: unknown) {
    super("The server's answer could not be read. Open the worksheet anew to see what was saved.", { cause });
    this.name = "UnreadableAnswerError";
  }
}
