import type { Role } from "@restband/api/contract";

const may: Record<Role, string> = {
  owner: "does everything, and says who else may",
  editor: "creates and changes scenarios",
  reviewer: "reads, runs, comments, decides",
  reader: "reads and runs",
};

/** The roles as choices, with what each may do. */
export const roleChoices = (Object.keys(may) as Role[]).map((role) => ({
  value: role,
  label: role,
  remark: may[role],
}));

/** Whether a role may create and change scenarios; the server has the last word. */
export const mayEdit = (role: Role): boolean => role === "owner" || role === "editor";
