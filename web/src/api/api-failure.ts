import type { Failure } from "@restband/api/contract";

/** Any call that did not succeed. `message` is a sentence for people. */
export class ApiFailure extends Error {
  /** For programs: the server's own code, or `unreachable` where no server answered. */
  readonly code: string;
  /** HTTP status; 0 where no server answered. */
  readonly status: number;
  readonly fields: Failure["fields"];
  /** On a 409 of a save: the version now stored. */
  readonly current: Failure["current"];

  constructor(
    status: number,
    { code, message, fields = [], current }: Pick<Failure, "code" | "message"> & Partial<Failure>,
  ) {
    super(message);
    this.name = "ApiFailure";
    this.status = status;
    this.code = code;
    this.fields = fields;
    this.current = current;
  }

  /** No server answered, or it said that it cannot work just now: worth trying again, and no fault of the input. */
  get isUnreachable(): boolean {
    return this.status === 0 || this.status === 502 || this.status === 503 || this.status === 504;
  }

  /** The session has ended or never began. */
  get isSignedOut(): boolean {
    return this.status === 401 && this.code === "not-signed-in";
  }
}

export const unreachable = () =>
  new ApiFailure(0, { code: "unreachable", message: "The server does not answer. What you typed stays here." });
