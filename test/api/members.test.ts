import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { createAccountsService } from "../../api/src/accounts/accounts-service.ts";
import type { Member, Project } from "../../api/src/contract.ts";
import { createMembersService } from "../../api/src/members/members-service.ts";
import { addMember, createProject, signUp } from "../support/people.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

let server: TestServer;
beforeAll(async () => (server = await startTestServer()));
afterAll(() => server.stop());

describe("a project", () => {
  it("is made with its maker as owner, and is listed for members only", async () => {
    const [ada, bo] = [await signUp(server, "Ada"), await signUp(server, "Bo")];
    const body = { name: "  Hall 3 refit ", description: "Way material" };
    const made = await ada.get<Project>("createProject", { body });
    expect(made).toMatchObject({ name: "Hall 3 refit", description: "Way material", role: "owner", scenarioCount: 0 });
    expect(await ada.get("listProjects")).toEqual([made]);
    expect(await bo.get("listProjects")).toEqual([]);
  });

  it("changes name and description, and says when", async () => {
    const cy = await signUp(server, "Cy");
    const projectId = await createProject(cy);
    const before = await cy.get<Project>("readProject", { params: { projectId } });
    const body = { name: "Hall 4 – «новый» 🛠", description: "" };
    const after = await cy.get<Project>("changeProject", { params: { projectId }, body });
    expect(after).toMatchObject({ id: projectId, ...body });
    expect(after.updatedAt > before.updatedAt).toBe(true);
  });
});

describe("members", () => {
  it("are added by address, in any case, and told in the order they came", async () => {
    const [di, ed] = [await signUp(server, "Di"), await signUp(server, "Ed")];
    const projectId = await createProject(di);
    const body = { email: ed.email.toUpperCase(), role: "reviewer" };
    const added = await di.get<Member>("addMember", { params: { projectId }, body });
    expect(added).toMatchObject({ accountId: ed.accountId, name: "Ed", email: ed.email, role: "reviewer" });
    const members = await ed.get<Member[]>("listMembers", { params: { projectId } });
    expect(members.map(({ name, role }) => [name, role])).toEqual([
      ["Di", "owner"],
      ["Ed", "reviewer"],
    ]);
  });

  it("are not added twice, nor without an account, with a sentence at the address", async () => {
    const [fi, gus] = [await signUp(server, "Fi"), await signUp(server, "Gus")];
    const projectId = await createProject(fi);
    await addMember(fi, projectId, gus.email, "reader");
    const again = await fi.fail("addMember", { params: { projectId }, body: { email: gus.email, role: "editor" } });
    expect(again).toMatchObject({ status: 409, code: "already-member", fields: [{ path: "email" }] });
    const nobody = { email: "nobody@workshop.example", role: "editor" };
    const unknown = await fi.fail("addMember", { params: { projectId }, body: nobody });
    expect(unknown).toMatchObject({ status: 422, code: "no-account", fields: [{ path: "email" }] });
  });

  it("have their new role at the next request, in the session they have open", async () => {
    const [hal, ida] = [await signUp(server, "Hal"), await signUp(server, "Ida")];
    const projectId = await createProject(hal);
    await addMember(hal, projectId, ida.email, "reader");
    const rename = { params: { projectId }, body: { name: "Renamed", description: "" } };
    const change = (role: string) =>
      hal.get("changeMember", { params: { projectId, accountId: ida.accountId }, body: { role } });
    expect((await ida.fail("changeProject", rename)).status).toBe(403);
    await change("owner");
    expect((await ida.call("changeProject", rename)).status).toBe(200);
    await change("reviewer");
    expect((await ida.fail("changeProject", rename)).status).toBe(403);
    await hal.get("removeMember", { params: { projectId, accountId: ida.accountId } });
    expect((await ida.fail("readProject", { params: { projectId } })).status).toBe(404);
  });

  it("may leave by themselves, and not take anybody with them", async () => {
    const [jo, ko, leo] = [await signUp(server, "Jo"), await signUp(server, "Ko"), await signUp(server, "Leo")];
    const projectId = await createProject(jo);
    await addMember(jo, projectId, ko.email, "reader");
    await addMember(jo, projectId, leo.email, "editor");
    const remove = (accountId: string) => ({ params: { projectId, accountId } });
    expect((await leo.fail("removeMember", remove(ko.accountId))).status).toBe(403);
    expect((await ko.call("removeMember", remove(ko.accountId))).status).toBe(204);
    expect(await ko.get("listProjects")).toEqual([]);
  });
});

describe("the last owner", () => {
  it("can neither leave nor become anything else, until there is another", async () => {
    const [max, nia] = [await signUp(server, "Max"), await signUp(server, "Nia")];
    const projectId = await createProject(max);
    const itself = { projectId, accountId: max.accountId };
    await addMember(max, projectId, nia.email, "editor");
    expect(await max.fail("removeMember", { params: itself })).toMatchObject({ status: 409, code: "last-owner" });
    const demoted = await max.fail("changeMember", { params: itself, body: { role: "editor" } });
    expect(demoted).toMatchObject({ status: 409, code: "last-owner" });
    await max.get("changeMember", { params: { projectId, accountId: nia.accountId }, body: { role: "owner" } });
    expect((await max.call("removeMember", { params: itself })).status).toBe(204);
  });

  it("is left when two owners go at the same time", async () => {
    for (let round = 0; round < 5; round += 1) {
      const [ola, pia] = [await signUp(server, `Ola${round}`), await signUp(server, `Pia${round}`)];
      const projectId = await createProject(ola);
      await addMember(ola, projectId, pia.email, "owner");
      const statuses = await Promise.all(
        [ola, pia].map(async (person) => {
          const params = { projectId, accountId: person.accountId };
          return (await person.call("removeMember", { params })).status;
        }),
      );
      expect(statuses.sort()).toEqual([204, 409]);
    }
  });
});

it("writes each act into the trail", async () => {
  const [quin, ray] = [await signUp(server, "Quin"), await signUp(server, "Ray")];
  const projectId = await createProject(quin);
  const params = { projectId, accountId: ray.accountId };
  await addMember(quin, projectId, ray.email, "reader");
  await quin.get("changeMember", { params, body: { role: "editor" } });
  await ray.get("removeMember", { params });
  const rows = await server.database("activity").where({ project_id: projectId }).orderBy("id").select<object[]>("*");
  expect(rows).toMatchObject([
    { act: "project.created", account_id: quin.accountId },
    { act: "member.added", account_id: quin.accountId, subject_id: ray.accountId, detail: { role: "reader" } },
    { act: "member.changed", detail: { before: "reader", role: "editor" } },
    { act: "member.removed", account_id: ray.accountId, subject_id: ray.accountId, detail: { before: "editor" } },
  ]);
});

describe("an owner who is none any more when the change comes to be made", () => {
  it("changes nobody's role and removes nobody, but may go", async () => {
    const [una, vic] = [await signUp(server, "Una"), await signUp(server, "Vic")];
    const projectId = await createProject(una);
    await addMember(una, projectId, vic.email, "reviewer");
    const members = createMembersService(server.database, createAccountsService(server.database));
    await expect(members.change(projectId, una.accountId, "reader", vic.accountId)).rejects.toMatchObject({
      ...{ status: 403, message: "Your role in this project is reviewer; this takes owner." },
    });
    await expect(members.remove(projectId, una.accountId, vic.accountId)).rejects.toMatchObject({ status: 403 });
    const stranger = crypto.randomUUID();
    await expect(members.change(projectId, vic.accountId, "owner", stranger)).rejects.toMatchObject({ status: 404 });
    await members.remove(projectId, vic.accountId, vic.accountId);
    expect((await members.list(projectId)).map(({ name }) => name)).toEqual(["Una"]);
  });
});
