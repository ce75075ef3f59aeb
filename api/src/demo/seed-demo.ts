import { createAccountsService } from "../accounts/accounts-service.ts";
import type { Database } from "../database/database.ts";
import { createMembersService } from "../members/members-service.ts";
import type { Role } from "../members/members-schema.ts";
import { createProjectsService } from "../projects/projects-service.ts";
import { createScenariosService } from "../scenarios/scenarios-service.ts";
import { type DemoPerson, demoPeople } from "./demo-people.ts";
import type { DemoProject } from "./demo-project.ts";
import { hall3Refit } from "./projects/hall-3-refit.ts";
import { hangerLine } from "./projects/hanger-line.ts";
import { testFloor } from "./projects/test-floor.ts";

export const demoProjects: readonly DemoProject[] = [testFloor, hangerLine, hall3Refit];

/**
 * Makes the people of the demo, all with the given password, their projects and scenarios, by the same services as
 * everybody else's. A person who has an account already keeps it as it is.
 */
export async function seedDemo(database: Database, password: string): Promise<void> {
  const accounts = createAccountsService(database);
  const members = createMembersService(database, accounts);
  const services = {
    members,
    projects: createProjectsService(database, members),
    scenarios: createScenariosService(database, members),
  };
  const ids = {} as Record<DemoPerson, string>;
  for (const [person, { name, email }] of Object.entries(demoPeople) as [
    DemoPerson,
    (typeof demoPeople)[DemoPerson],
  ][]) {
    await accounts.signUp({ name, email, password });
    ids[person] = (await accounts.findByEmail(email))!.id;
  }
  for (const project of demoProjects) await seedProject(services, project, ids);
}

async function seedProject(
  services: {
    members: ReturnType<typeof createMembersService>;
    projects: ReturnType<typeof createProjectsService>;
    scenarios: ReturnType<typeof createScenariosService>;
  },
  { name, description, owner, members, scenarios }: DemoProject,
  ids: Record<DemoPerson, string>,
): Promise<void> {
  const { id } = await services.projects.create({ name, description }, ids[owner]);
  for (const [person, role] of Object.entries(members) as [DemoPerson, Role][]) {
    await services.members.add(id, { email: demoPeople[person].email, role }, ids[owner]);
  }
  for (const { by, content } of scenarios) await services.scenarios.create(id, { content }, ids[by]);
}
