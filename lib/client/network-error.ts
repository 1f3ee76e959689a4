/** The request never reached an answer: no network, or the server could not be reached. It may still have arrived. */
export class NetworkError extends Error {
  constructor(cause: unknown) {
    super("The server could not be reached.", { cause });
    this.name = "NetworkError";
  }
}
