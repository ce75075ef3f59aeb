import type { Project, Role, Session, StoredScenario } from "../../api/src/contract.ts";
import type { Browser } from "./browser.ts";
import type { TestServer } from "./test-server.ts";

export const password = "four unrelated words";

/** Signs somebody up and in: `Ada` has the address `ada@workshop.example`. */
export async function signUp(
  server: TestServer,
  name: string,
): Promise<Browser & { accountId: string; email: string }> {
  const email = emailOf(name);
  const browser = await server.browser().open();
  await browser.get("signUp", { body: { name, email, password } });
  await browser.signIn(email, password);
  const { account } = await browser.get<Session>("readSession");
  return Object.assign(browser, { accountId: account!.id, email });
}

export const emailOf = (name: string): string => `${name.toLowerCase()}@workshop.example`;

export async function createProject(owner: Browser, name = "Hall 3"): Promise<string> {
  const project = await owner.get<Project>("createProject", { body: { name, description: "" } });
  return project.id;
}

export async function addMember(owner: Browser, projectId: string, email: string, role: Role): Promise<void> {
  await owner.get("addMember", { params: { projectId }, body: { email, role } });
}

/** A scenario as short as the format allows. */
export const smallScenario = {
  format: "restband-scenario/1",
  motion: "linear",
  body: { inertia: 2, stiffness: 800 },
  contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 10 } },
  span: { seconds: 5 },
};

export async function createScenario(author: Browser, projectId: string, content: object = smallScenario) {
  return author.get<StoredScenario>("createScenario", { params: { projectId }, body: { content } });
}
