import type { SweepPlan } from "@restband/solver";
import { render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it, vi } from "vitest";
import { ApiFailure } from "../../../web/src/api/api-failure.ts";
import { StudyBuilder } from "../../../web/src/features/explore/study/study-builder.tsx";
import { SweepBuilder } from "../../../web/src/features/explore/sweep/sweep-builder.tsx";
import { creepFeed } from "../support/scenarios.ts";

const fullStore =
  "The sweeps and studies of this project hold 199 of 200 MB. Delete one to make room, or ask for fewer cells.";

describe("asking for a sweep", () => {
  it("says that the store is full, keeps what was typed, and asks again when told to", async () => {
    const user = userEvent.setup();
    const onRun = vi.fn<(asked: { plan: SweepPlan }) => Promise<void>>();
    onRun.mockRejectedValueOnce(new ApiFailure(507, { code: "full-store", message: fullStore })).mockResolvedValue();
    render(<SweepBuilder scenario={creepFeed} onRun={onRun} />);
    const values = within(screen.getByRole("group", { name: "Across" })).getByLabelText("values");
    await user.clear(values);
    await user.type(values, "7");
    await user.click(screen.getByRole("button", { name: "Run the sweep" }));
    expect(await screen.findByRole("alert")).toHaveTextContent(fullStore);
    expect(values).toHaveValue("7");
    await user.click(screen.getByRole("button", { name: "Run the sweep" }));
    expect(onRun).toHaveBeenCalledTimes(2);
    expect(onRun.mock.lastCall?.[0].plan.axes[0]).toMatchObject({ count: 7 });
    expect(screen.queryByRole("alert")).not.toBeInTheDocument();
  });

  it("counts what is to be put right and runs nothing until it is", async () => {
    const user = userEvent.setup();
    const onRun = vi.fn(() => Promise.resolve());
    render(<SweepBuilder scenario={creepFeed} onRun={onRun} />);
    await user.type(within(screen.getByRole("group", { name: "Up" })).getByLabelText("from"), "x");
    await user.click(screen.getByRole("button", { name: "Run the sweep" }));
    expect(screen.getByText("1 field to put right")).toBeInTheDocument();
    expect(onRun).not.toHaveBeenCalled();
  });
});

describe("asking for a study", () => {
  it("refuses a covariance that none can have, in a sentence under it, and takes one that is put right", async () => {
    const user = userEvent.setup();
    const onRun = vi.fn(() => Promise.resolve());
    render(<StudyBuilder scenario={creepFeed} onRun={onRun} />);
    await user.click(screen.getByRole("button", { name: "Let values scatter by a covariance" }));
    await user.selectOptions(screen.getByLabelText("How they scatter is told by"), "their covariance");
    const entry = screen.getByLabelText(/^Covariance of /);
    await user.clear(entry);
    await user.type(entry, "900");
    expect(
      screen.getByText(/^No values scatter like this: a covariance must be positive definite\./),
    ).toBeInTheDocument();
    await user.click(screen.getByRole("button", { name: "Run the study" }));
    expect(onRun).not.toHaveBeenCalled();
    await user.clear(entry);
    await user.type(entry, "0");
    await user.click(screen.getByRole("button", { name: "Run the study" }));
    expect(onRun).toHaveBeenCalledWith(
      expect.objectContaining({ joint: [expect.objectContaining({ paths: ["body.viscous", "body.inertia"] })] }),
      "2000 draws of static friction, kinetic friction, damping and mass",
    );
  });
});
