import type { HandlersOf } from "../route-handler.ts";
import type { MembersService } from "./members-service.ts";

export function membersRoutes(
  members: MembersService,
): HandlersOf<"listMembers" | "addMember" | "changeMember" | "removeMember"> {
  return {
    listMembers: ({ params }) => members.list(params.projectId),
    addMember: ({ params, body, account }) => members.add(params.projectId, body, account.id),
    changeMember: ({ params, body, account }) =>
      members.change(params.projectId, params.accountId, body.role, account.id),
    removeMember: ({ params, account }) => members.remove(params.projectId, params.accountId, account.id),
  };
}
