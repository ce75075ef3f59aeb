import { type AccountsService, createAccountsService } from "../accounts/accounts-service.ts";
import { createCommentsService } from "../comments/comments-service.ts";
import { defaultLimits } from "../config.ts";
import type { Database } from "../database/database.ts";
import { createMembersService, type MembersService } from "../members/members-service.ts";
import type { Role } from "../members/members-schema.ts";
import { createProjectsService, type ProjectsService } from "../projects/projects-service.ts";
import { createDecisionsService } from "../reviews/decisions-service.ts";
import { createReviewsService } from "../reviews/reviews-service.ts";
import { createReadStandpoint } from "../reviews/standpoint.ts";
import { createRecomputing } from "../revisions/recompute-pool.ts";
import { createRevisionsService } from "../revisions/revisions-service.ts";
import { createScenariosService } from "../scenarios/scenarios-service.ts";
import { type DemoPerson, demoPeople } from "./demo-people.ts";
import type { DemoProject } from "./demo-project.ts";
import { hall3Refit } from "./projects/hall-3-refit.ts";
import { hangerLine } from "./projects/hanger-line.ts";
import { testFloor } from "./projects/test-floor.ts";
import { type ReviewServices, seedReview } from "./seed-review.ts";

export const demoProjects: readonly DemoProject[] = [testFloor, hangerLine, hall3Refit];

interface Services extends ReviewServices {
  readonly accounts: AccountsService;
  readonly members: MembersService;
  readonly projects: ProjectsService;
}

/**
 * Makes the people of the demo, all with the given password, their projects, scenarios and reviews, by the same services as
 * everybody else's. A person who has an account already keeps it as it is.
 */
export async function seedDemo(database: Database, password: string): Promise<void> {
  const services = createServices(database);
  const ids = {} as Record<DemoPerson, string>;
  for (const [person, { name, email }] of Object.entries(demoPeople) as [
    DemoPerson,
    (typeof demoPeople)[DemoPerson],
  ][]) {
    await services.accounts.signUp({ name, email, password });
    ids[person] = (await services.accounts.findByEmail(email))!.id;
  }
  for (const project of demoProjects) await seedProject(services, project, ids);
}

function createServices(database: Database): Services {
  const accounts = createAccountsService(database);
  const members = createMembersService(database, accounts);
  const revisions = createRevisionsService(database, createRecomputing(defaultLimits.recomputing));
  const readStandpoint = createReadStandpoint(revisions);
  return {
    accounts,
    members,
    revisions,
    projects: createProjectsService(database, members),
    scenarios: createScenariosService(database, members),
    comments: createCommentsService(database, members, revisions),
    reviews: createReviewsService(database, readStandpoint),
    decisions: createDecisionsService(database, revisions, readStandpoint),
  };
}

async function seedProject(
  services: Services,
  { name, description, owner, members, scenarios }: DemoProject,
  ids: Record<DemoPerson, string>,
): Promise<void> {
  const { id: projectId } = await services.projects.create({ name, description }, ids[owner]);
  for (const [person, role] of Object.entries(members) as [DemoPerson, Role][]) {
    await services.members.add(projectId, { email: demoPeople[person].email, role }, ids[owner]);
  }
  for (const { by, content, review } of scenarios) {
    if (!review) {
      await services.scenarios.create(projectId, { content }, ids[by]);
      continue;
    }
    const [maker, reviewer] = await Promise.all([by, review.reviewer].map((who) => services.accounts.find(ids[who])));
    await services.reviews.setChecklist(projectId, { points: [...review.checklist] }, ids[owner]);
    await seedReview(services, { projectId, maker: maker!, reviewer: reviewer! }, content, review);
  }
}
