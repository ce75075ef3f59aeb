import type { Account, Project, Session } from "@restband/api/contract";
import { vi } from "vitest";

/** One request as the server would see it. */
export interface Request {
  method: string;
  /** Below `/api`. */
  path: string;
  headers: Record<string, string>;
  body: unknown;
}

export interface Reply {
  status: number;
  body?: unknown;
}

/** Answers requests by "METHOD /path"; what is not listed is a 404. A function sees the request. */
export type Answers = Record<string, Reply | ((request: Request) => Reply | Promise<Reply>)>;

export const ok = (body: unknown): Reply => ({ status: 200, body });
export const refuse = (
  status: number,
  code: string,
  message: string,
  fields: { path: string; message: string }[] = [],
) => ({
  status,
  body: { error: { code, message, fields } },
});

/** Puts a server made of answers in the place of fetch; returns the requests it gets, oldest first. */
export function fakeServer(answers: Answers): Request[] {
  const requests: Request[] = [];
  vi.stubGlobal("fetch", async (url: string, init: RequestInit = {}) => {
    const request: Request = {
      method: init.method ?? "GET",
      path: url.replace(/^\/api/u, ""),
      headers: init.headers as Record<string, string>,
      body: typeof init.body === "string" ? JSON.parse(init.body) : undefined,
    };
    requests.push(request);
    const answer =
      answers[`${request.method} ${request.path}`] ?? refuse(404, "not-found", "There is nothing at this address.");
    const { status, body } = typeof answer === "function" ? await answer(request) : answer;
    return new Response(body === undefined ? null : JSON.stringify(body), { status });
  });
  return requests;
}

const id = (n: number) => `00000000-0000-4000-8000-${String(n).padStart(12, "0")}`;

export const ines: Account = {
  id: id(1),
  name: "Ines Duarte",
  email: "ines.duarte@okarin.example",
  isAdministrator: false,
  units: "millimetre",
};

/** A session of a person, or of nobody. */
export const session = (account: Session["account"], csrfToken = "token"): Session => ({ account, csrfToken });

export const project: Project = {
  id: id(10),
  name: "Hall 3 refit",
  description: "Way material, feed damper and clamps.",
  role: "owner",
  scenarioCount: 0,
  createdAt: "2026-11-01T08:00:00.000Z",
  updatedAt: "2026-11-20T08:00:00.000Z",
  archivedAt: null,
};

/** The people of that project: an owner and an editor. */
export const members = [
  { accountId: ines.id, name: ines.name, email: ines.email, role: "owner", since: project.createdAt },
  { accountId: id(2), name: "Tomas Wik", email: "tomas.wik@okarin.example", role: "editor", since: project.createdAt },
];
