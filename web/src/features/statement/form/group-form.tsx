import type { ComponentType } from "react";
import type { Group, GroupKey } from "../groups.ts";
import { BodyForm } from "./body-form.tsx";
import { ContactForm } from "./contact-form.tsx";
import { DriveForm } from "./drive-form.tsx";
import { LimitsForm } from "./limits-form.tsx";
import { StartForm } from "./start-form.tsx";

const forms: Record<GroupKey, ComponentType> = {
  body: BodyForm,
  contact: ContactForm,
  drive: DriveForm,
  start: StartForm,
  limits: LimitsForm,
};

/** Every member of a group, labelled: for keyboards, screen readers, and what a sentence has no words for. */
export function GroupForm({ group }: { group: Group }) {
  const Form = forms[group.key];
  return <Form />;
}
