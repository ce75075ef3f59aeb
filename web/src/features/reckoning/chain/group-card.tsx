import { useState } from "react";
import { Button } from "../../../components/button.tsx";
import { classNames } from "../../../components/class-names.ts";
import { SelectField } from "../../../components/select.tsx";
import type { Motion } from "../../../format/unit.ts";
import { startEntries } from "../formula/entries.ts";
import { FormulaForm } from "../formula/formula-form.tsx";
import { membersFor, motionBehind, transmissionOf, transmissionsFor, type Kit } from "./kit.ts";
import { MemberCard } from "./member-card.tsx";
import { emptyGroup, isGroup, newMember, nextId, replaced, type Group, type Part } from "./part.ts";

interface GroupCardProps {
  group: Group;
  /** The whole tree, and the way to change it. */
  root: Group;
  onRoot: (root: Group) => void;
  /** How things move in front of the group. */
  motion: Motion;
  kit: Kit;
}

/** Parts that belong together: how they are joined, what they stand behind, each of them, and the way to add one. */
export function GroupCard({ group, root, motion, kit, onRoot }: GroupCardProps) {
  const isRoot = group.id === root.id;
  const set = (by: Group): void => onRoot(isRoot ? by : replaced(root, group.id, by));
  const behind = motionBehind(group.through, motion);
  return (
    <div
      role="group"
      aria-label={isRoot ? "The whole" : "Group"}
      className={classNames("flex flex-col gap-4", !isRoot && "border-l-[1.5px] border-ink pl-4")}
    >
      {!isRoot && (
        <Through {...{ group, motion }} onChange={set} onRemove={() => onRoot(replaced(root, group.id, null))} />
      )}
      {kit.canStandInSeries && group.parts.length > 1 && <Join group={group} onChange={set} />}
      {group.parts.map((part) =>
        isGroup(part) ? (
          <GroupCard key={part.id} group={part} root={root} motion={behind} kit={kit} onRoot={onRoot} />
        ) : (
          <MemberCard
            key={part.id}
            member={part}
            motion={behind}
            kit={kit}
            onChange={(by) => onRoot(replaced(root, part.id, by))}
          />
        ),
      )}
      <AddPart
        kit={kit}
        motion={behind}
        isRoot={isRoot}
        onAdd={(make) => set({ ...group, parts: [...group.parts, make(nextId(root))] })}
      />
    </div>
  );
}

function Join({ group, onChange }: { group: Group; onChange: (group: Group) => void }) {
  return (
    <SelectField
      label="These stand"
      choices={[
        { value: "series", label: "one after another: each carries the whole force" },
        { value: "parallel", label: "side by side: they share the force" },
      ]}
      value={group.join}
      onChange={(event) => onChange({ ...group, join: event.currentTarget.value as Group["join"] })}
    />
  );
}

interface ThroughProps {
  group: Group;
  motion: Motion;
  onChange: (group: Group) => void;
  onRemove: () => void;
}

/** What a group stands behind, with the numbers of its ratio. */
function Through({ group, motion, onChange, onRemove }: ThroughProps) {
  const transmission = transmissionOf(group.through);
  const choose = (key: string): void => {
    const chosen = transmissionOf(key);
    onChange({ ...group, through: key, entries: chosen ? startEntries(chosen) : {} });
  };
  return (
    <div className="flex flex-col gap-3">
      <div className="flex flex-wrap items-end gap-3">
        <SelectField
          label="The group stands"
          className="grow basis-60"
          choices={[
            { value: "", label: "before no transmission" },
            ...transmissionsFor(motion).map(({ key, label }) => ({ value: key, label: `behind ${label}` })),
          ]}
          value={group.through}
          onChange={(event) => choose(event.currentTarget.value)}
        />
        <Button onClick={onRemove}>Take the group away</Button>
      </div>
      {transmission && (
        <div>
          <FormulaForm
            formula={transmission}
            entries={group.entries}
            onChange={(entries) => onChange({ ...group, entries })}
          />
          <p className="mt-1 text-13 text-quiet">What stands behind it counts n² times at the body.</p>
        </div>
      )}
    </div>
  );
}

interface AddPartProps {
  kit: Kit;
  motion: Motion;
  isRoot: boolean;
  onAdd: (make: (id: number) => Part) => void;
}

const GROUP = "group";

/** Chooses what comes next and adds it. */
function AddPart({ kit, motion, isRoot, onAdd }: AddPartProps) {
  const members = membersFor(kit, motion);
  const [chosen, setChosen] = useState("");
  const key = members.some((member) => member.key === chosen) || chosen === GROUP ? chosen : (members[0]?.key ?? GROUP);
  const add = (): void => {
    const formula = members.find((member) => member.key === key);
    onAdd((id) => (formula ? newMember(id, formula) : newGroup(id, kit, motion)));
  };
  return (
    <div className="flex items-end gap-3">
      <SelectField
        label={isRoot ? "Add" : "Add to the group"}
        className="grow"
        choices={[
          ...members.map(({ key: value, label }) => ({ value, label })),
          { value: GROUP, label: "A group: behind a screw or gears, or joined otherwise" },
        ]}
        value={key}
        onChange={(event) => setChosen(event.currentTarget.value)}
        data-first-focus={isRoot || undefined}
      />
      <Button onClick={add}>Add</Button>
    </div>
  );
}

/** Groups are made to stand behind something, as a rule: it starts with the first that fits. */
function newGroup(id: number, kit: Kit, motion: Motion): Group {
  const [first] = transmissionsFor(motion);
  const group = emptyGroup(id, kit.canStandInSeries ? "series" : "parallel");
  return { ...group, through: first.key, entries: startEntries(first) };
}
