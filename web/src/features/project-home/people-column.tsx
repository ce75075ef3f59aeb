import type { Member, Role } from "@restband/api/contract";
import { useState } from "react";
import { useChangeMember, useRemoveMember } from "../../api/members.ts";
import { Avatar } from "../../components/avatar.tsx";
import { Button } from "../../components/button.tsx";
import { Confirm } from "../../components/confirm.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { Icon } from "../../components/icon.tsx";
import { PlainSelect } from "../../components/select.tsx";
import { announce } from "../../components/status.tsx";
import { AddMember } from "./add-member.tsx";
import { roleChoices } from "./roles.ts";

interface PeopleColumnProps {
  projectId: string;
  members: readonly Member[];
  ownId: string;
  /** True for owners, who say who may do what. */
  canManage: boolean;
  /** Called after one has left the project oneself. */
  onLeft: () => void;
}

/** Who is in the project, and as what. */
export function PeopleColumn({ projectId, members, ownId, canManage, onLeft }: PeopleColumnProps) {
  const [removing, setRemoving] = useState<Member | null>(null);
  const [failure, setFailure] = useState<string | null>(null);
  const change = useChangeMember(projectId);
  const changeRole = async (member: Member, role: Role) => {
    setFailure(null);
    try {
      await change.mutateAsync({ accountId: member.accountId, role });
      announce(`${member.name} is ${role} now.`);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : String(error));
    }
  };
  return (
    <section aria-labelledby="people">
      <h2 id="people" className="border-b border-edge pb-2.5 text-15 font-bold">
        People
      </h2>
      <ul className="flex flex-col gap-4 py-4">
        {members.map((member) => (
          <li key={member.accountId} className="flex items-center gap-3">
            <Avatar name={member.name} />
            <div className="min-w-0 grow leading-snug">
              <p className="truncate font-semibold" title={member.email}>
                {member.name}
              </p>
              <p className="text-13 text-quiet">
                {canManage ? <RoleSelect member={member} onRole={(role) => changeRole(member, role)} /> : member.role}
                {member.accountId === ownId && " · you"}
              </p>
            </div>
            {canManage && (
              <Button
                kind="quiet"
                aria-label={`Remove ${member.name}`}
                title={`Remove ${member.name}`}
                onClick={() => setRemoving(member)}
              >
                <Icon name="cross" size={12} />
              </Button>
            )}
          </li>
        ))}
      </ul>
      {failure && <ErrorNote className="mb-4">{failure}</ErrorNote>}
      {canManage && <AddMember projectId={projectId} />}
      {!canManage && (
        <LeaveLink onLeave={() => setRemoving(members.find(({ accountId }) => accountId === ownId) ?? null)} />
      )}
      <RemoveMember
        projectId={projectId}
        member={removing}
        isSelf={removing?.accountId === ownId}
        onClose={() => setRemoving(null)}
        onLeft={onLeft}
      />
    </section>
  );
}

function RoleSelect({ member, onRole }: { member: Member; onRole: (role: Role) => void }) {
  return (
    <PlainSelect
      isQuiet
      choices={roleChoices}
      value={member.role}
      aria-label={`Role of ${member.name}`}
      onChange={(event) => onRole(event.target.value as Role)}
    />
  );
}

function LeaveLink({ onLeave }: { onLeave: () => void }) {
  return (
    <button type="button" className="link" onClick={onLeave}>
      Leave this project
    </button>
  );
}

interface RemoveMemberProps {
  projectId: string;
  /** Whom to remove; nobody while null. */
  member: Member | null;
  isSelf: boolean;
  onClose: () => void;
  onLeft: () => void;
}

function RemoveMember({ projectId, member, isSelf, onClose, onLeft }: RemoveMemberProps) {
  const remove = useRemoveMember(projectId, isSelf);
  const confirm = async () => {
    if (!member) return;
    await remove.mutateAsync(member.accountId);
    announce(isSelf ? "You have left the project." : `${member.name} is no longer in the project.`);
    if (isSelf) onLeft();
  };
  return (
    <Confirm
      isOpen={member !== null}
      title={isSelf ? "Leave this project" : `Remove ${member?.name ?? ""}`}
      action={isSelf ? "Leave" : "Remove"}
      onConfirm={confirm}
      onClose={onClose}
    >
      {isSelf
        ? "You no longer see anything of the project. What you made in it stays."
        : "They no longer see anything of the project, from now on. What they made in it stays."}
    </Confirm>
  );
}
