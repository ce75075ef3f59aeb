import type { Checklist } from "@restband/api/contract";
import { useState } from "react";
import { useSetChecklist } from "../../api/reviews.ts";
import { Button } from "../../components/button.tsx";
import { DialogActions } from "../../components/dialog.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { TextArea } from "../../components/text-field.tsx";
import { otherFault } from "./fault-of.ts";

interface ChecklistFormProps {
  projectId: string;
  checklist: Checklist;
  onClose: () => void;
}

/** The points every reviewer of the project answers before a revision is accepted, one a line. */
export function ChecklistForm({ projectId, checklist, onClose }: ChecklistFormProps) {
  const save = useSetChecklist(projectId);
  const [text, setText] = useState(checklist.points.join("\n"));
  const points = text
    .split("\n")
    .map((line) => line.trim())
    .filter(Boolean);
  const fault = faultOf(points);
  return (
    <>
      <TextArea
        label="Points, one a line"
        help="Each is answered by yes, no or does not apply. With a no, a revision cannot be accepted."
        rows={8}
        data-first-focus
        value={text}
        error={fault}
        onChange={(event) => setText(event.target.value)}
      />
      {save.error && <ErrorNote className="mt-4">{otherFault(save.error, [])}</ErrorNote>}
      <DialogActions>
        <Button
          kind="primary"
          isBusy={save.isPending}
          onClick={() => !fault && save.mutate(points, { onSuccess: onClose })}
        >
          Keep the checklist
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </DialogActions>
    </>
  );
}

function faultOf(points: readonly string[]): string | undefined {
  if (points.length > 40) return `At most 40 points, now ${points.length}.`;
  const long = points.findIndex((point) => point.length > 300);
  if (long >= 0) return `Point ${long + 1} is longer than 300 characters.`;
  const twice = points.find((point, i) => points.indexOf(point) < i);
  return twice && `“${twice}” stands here twice.`;
}
