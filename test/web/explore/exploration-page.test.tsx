import { answerRun, cellLines, cellOf, checkSweepPlan, runTile, type Scenario, type SweepPlan } from "@restband/solver";
import { screen, waitFor, within } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { noteRunning } from "../../../web/src/features/explore/kept/running-here.ts";
import { buildScenario } from "../../support/scenario-builder.ts";
import { sweepServer } from "../support/exploration-page.ts";
import { openPage } from "../support/open-page.tsx";
import { creepFeed } from "../support/scenarios.ts";

vi.mock("../../../web/src/compute/start-worker.ts", async () =>
  (await import("../support/scenario-page.tsx")).workerInOneThread(),
);
vi.mock("../../../web/src/compute/start-explore-worker.ts", async () =>
  (await import("../support/exploration-page.ts")).exploreInOneThread(),
);

const scenario = { ...creepFeed, span: { ...creepFeed.span, seconds: 0.05 } };
const planned = (of: Scenario, more: object): SweepPlan =>
  checkSweepPlan({ format: "restband-sweep/1", quantities: ["stickFraction"], ...more }, of).plan as SweepPlan;
const plan = planned(scenario, {
  axes: [
    { path: "contact.law.kinetic", spacing: "linear", from: 0.05, to: 0.14, count: 12 },
    { path: "base[0].rate", spacing: "log", from: 0.001, to: 0.1, count: 12 },
  ],
});

beforeEach(() => {
  localStorage.clear();
  // jsdom draws nothing on a canvas
  vi.spyOn(HTMLCanvasElement.prototype, "getContext").mockReturnValue(null);
});
afterEach(() => vi.unstubAllGlobals());

const conclusions = ({ requests }: ReturnType<typeof sweepServer>) =>
  requests.filter(({ path }) => path.endsWith("/conclusion")).map(({ body }) => body);

describe("the page of a sweep", () => {
  it("goes on by itself where this browser was computing it, and is concluded", async () => {
    const server = sweepServer(scenario, plan);
    noteRunning(server.id);
    openPage(server.at);
    expect(await screen.findByText(/^Of 144 cells /)).toBeInTheDocument();
    await waitFor(() => expect(conclusions(server)).toHaveLength(1));
    expect(conclusions(server)[0]).toMatchObject({ headline: expect.stringMatching(/^Of 144 cells /) as string });
    expect(screen.queryByRole("button", { name: "Resume" })).not.toBeInTheDocument();
  });

  it("waits to be told where nobody here was", async () => {
    const server = sweepServer(scenario, plan);
    const { user } = openPage(server.at);
    await user.click(await screen.findByRole("button", { name: "Resume" }));
    await waitFor(() => expect(conclusions(server)).toHaveLength(1));
  });

  it("watches it fill where somebody else computes it", async () => {
    const server = sweepServer(scenario, plan);
    const content = Buffer.from((runTile(scenario, plan, 0) as Float64Array).buffer).toString("base64");
    server.tiles.set(0, content);
    server.runner = "Tomas Wik";
    noteRunning(server.id);
    openPage(server.at);
    expect(
      await screen.findByText(/^Tomas Wik computes this just now\. [1-9]\d* of 144 cells are here\.$/),
    ).toBeVisible();
    expect(screen.queryByRole("button", { name: "Resume" })).not.toBeInTheDocument();
    expect(server.tiles.size).toBe(1);
  });

  it("takes in what other machines have solved, and refuses what does not agree", async () => {
    const server = sweepServer(scenario, plan);
    const { user } = openPage(server.at);
    await user.click(await screen.findByText("Solve it on other machines"));
    const [header, ...cells] = cellLines(scenario, plan);
    const answers = cells.map((_, index) => {
      const run = answerRun({ scenario: cellOf(scenario, plan, index).scenario!, quantities: ["stickFraction"] });
      return "reason" in run ? "" : JSON.stringify([index, run.outcome, run.quantities.stickFraction]);
    });
    const bring = (lines: readonly string[]) =>
      user.upload(screen.getByLabelText("Bring in the answers"), new File([lines.join("\n")], "answers.jsonl"));
    await bring([header, ...answers.slice(1)]);
    expect(await screen.findByText("Cell 0 has no answer.")).toBeInTheDocument();
    expect(server.tiles.size).toBe(0);
    await bring([header, ...answers]);
    await waitFor(() => expect(conclusions(server)).toHaveLength(1));
    expect(screen.queryByText("Cell 0 has no answer.")).not.toBeInTheDocument();
  });

  it("names the line between sticking and sliding, says how it was found, and shows a limit and a scale of ratios", async () => {
    const limited = { ...scenario, span: { ...scenario.span, seconds: 5 } };
    const small = planned(limited, {
      axes: plan.axes.map((axis) => ({ ...axis, count: 6 })),
      quantities: ["stickFraction", "peakVelocity"],
    });
    const server = sweepServer(limited, small);
    noteRunning(server.id);
    const { user } = openPage(server.at);
    expect(await screen.findByText("limit of smooth sliding")).toBeInTheDocument();
    expect(screen.getByText(/^Limit of smooth sliding, searched by runs/)).toBeInTheDocument();
    expect(
      screen.getByText(/^Lowest smooth feed, exact: .* of feed at 0\.14 of kinetic friction\./),
    ).toBeInTheDocument();
    const pick = screen.getByRole("combobox", { name: "What the map shows" });
    await user.selectOptions(pick, "Limit: Share of time stuck");
    expect(await screen.findByText("limit of the share of time stuck")).toBeInTheDocument();
    expect(screen.getAllByText("kept").length).toBeGreaterThan(1);
    await user.selectOptions(pick, "Peak velocity");
    await user.selectOptions(screen.getByRole("combobox", { name: "Scale" }), "on a scale of ratios");
    expect(screen.getByText(/^By ratio; its middle is /)).toBeInTheDocument();
  });

  it("tells both branches of cells that follow one another", async () => {
    const belt = buildScenario({
      body: { inertia: 1, stiffness: 1, viscous: 0.1 },
      contact: {
        law: { model: "stribeck", static: 1, kinetic: 0.5, velocity: 0.5, exponent: 1 },
        normal: { preload: 1 },
        counterface: { velocity: 1 },
      },
      span: { seconds: 400, untilRest: false },
    });
    const server = sweepServer(
      belt,
      planned(belt, {
        axes: [{ path: "contact.counterface.velocity", spacing: "listed", values: [1.1, 1.5, 1.9] }],
        continuation: "both",
      }),
    );
    noteRunning(server.id);
    const { user } = openPage(server.at);
    const map = await screen.findByRole("application");
    await waitFor(() => expect(map).toHaveTextContent(/belt speed 1\.5 m\/s: sticks and slips\./));
    expect(screen.getByText(/Each cell starts where its neighbour ended, up and then down\./)).toBeInTheDocument();
    await user.selectOptions(screen.getByRole("combobox", { name: "Branch" }), "on the way down");
    expect(map).toHaveTextContent(/belt speed 1\.5 m\/s: slides smoothly\./);
    const cell = within(screen.getByRole("region", { name: "Selected cell" }));
    expect(await cell.findByText(/^slides smoothly/i)).toBeInTheDocument();
  });
});
