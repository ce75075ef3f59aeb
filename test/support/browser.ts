import type { Failure, RouteName } from "../../api/src/contract.ts";
import { type Route, routes } from "../../api/src/contract.ts";

export interface Answer<Body = unknown> {
  readonly status: number;
  readonly headers: Headers;
  readonly body: Body;
}

export interface Request {
  readonly params?: Readonly<Record<string, string>>;
  readonly body?: unknown;
  /** Sent as it is, instead of `body` as JSON. */
  readonly text?: string;
  readonly query?: string;
  readonly version?: number;
  /** Over those a browser sends; undefined leaves one out. */
  readonly headers?: Readonly<Record<string, string | undefined>>;
}

/** What a page in a browser does: keeps the cookie, sends `Origin`, the session's token and the version it has seen. */
export class Browser {
  readonly address: string;
  cookie: string | undefined;
  csrfToken: string | undefined;

  constructor(address: string) {
    this.address = address;
  }

  /** Calls a route of the contract. */
  async call<Body = never>(name: RouteName, request: Request = {}): Promise<Answer<Body>> {
    const route: Route = routes[name];
    const path = route.path.replace(/:(\w+)/g, (_, key: string) => request.params?.[key] ?? `:${key}`);
    return this.send(route.method, `/api${path}${request.query ?? ""}`, request);
  }

  /** As `call`, and takes it for granted that it succeeds. */
  async get<Body>(name: RouteName, request: Request = {}): Promise<Body> {
    const answer = await this.call<Body>(name, request);
    if (answer.status >= 300) throw new Error(`${name} answered ${answer.status}: ${JSON.stringify(answer.body)}`);
    return answer.body;
  }

  /** As `call`, and takes it for granted that it fails. */
  async fail(name: RouteName, request: Request = {}): Promise<Failure & { status: number; headers: Headers }> {
    const { status, headers, body } = await this.call<{ error: Failure }>(name, request);
    if (status < 400) throw new Error(`${name} answered ${status}.`);
    return { ...body.error, status, headers };
  }

  async send<Body>(
    method: string,
    path: string,
    { body, text, version, headers }: Request = {},
  ): Promise<Answer<Body>> {
    const sent = { ...this.#headers(body !== undefined || text !== undefined, version), ...headers };
    const response = await fetch(`${this.address}${path}`, {
      method,
      redirect: "manual",
      headers: Object.fromEntries(
        Object.entries(sent).filter((entry): entry is [string, string] => entry[1] !== undefined),
      ),
      body: text ?? (body === undefined ? undefined : JSON.stringify(body)),
    });
    this.cookie = response.headers.getSetCookie().at(-1)?.split(";")[0] ?? this.cookie;
    const answer = await response.text();
    return { status: response.status, headers: response.headers, body: parsed(answer, response) as Body };
  }

  /** Reads the session and keeps its token, as every page does first. */
  async open(): Promise<this> {
    const { csrfToken } = await this.get<{ csrfToken: string }>("readSession");
    this.csrfToken = csrfToken;
    return this;
  }

  async signIn(email: string, password: string): Promise<this> {
    await this.open();
    const { csrfToken } = await this.get<{ csrfToken: string }>("signIn", { body: { email, password } });
    this.csrfToken = csrfToken;
    return this;
  }

  #headers(hasBody: boolean, version: number | undefined): Record<string, string | undefined> {
    return {
      Cookie: this.cookie,
      Origin: this.address,
      "X-CSRF-Token": this.csrfToken,
      "Content-Type": hasBody ? "application/json" : undefined,
      "If-Match": version === undefined ? undefined : `"${version}"`,
    };
  }
}

function parsed(text: string, response: Response): unknown {
  return response.headers.get("Content-Type")?.startsWith("application/json") ? JSON.parse(text) : text;
}
