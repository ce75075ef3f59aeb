import { QueryClientProvider } from "@tanstack/react-query";
import { digestOf, simulate, type Result } from "@restband/solver";
import { render, screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, describe, expect, it, vi } from "vitest";
import { makeQueryClient } from "../../../web/src/api/query-client.ts";
import { FreezeForm } from "../../../web/src/features/revision/freeze-form.tsx";
import { fakeServer, ines, ok, project, refuse, session, type Answers } from "../support/fake-server.ts";
import { creepFeed } from "../support/scenarios.ts";

const scenarioId = "00000000-0000-4000-8000-000000000100";
const at = `/projects/${project.id}/scenarios/${scenarioId}/revisions`;
const result = simulate(creepFeed, {}) as Result;
const subject = {
  ...{ projectId: project.id, scenarioId, version: 3 },
  ...{ digest: digestOf(creepFeed), scenario: creepFeed, result },
};

function open(answers: Answers) {
  const requests = fakeServer({ "GET /session": ok(session(ines)), ...answers });
  const onFrozen = vi.fn();
  render(
    <QueryClientProvider client={makeQueryClient()}>
      <FreezeForm subject={subject} missing={["Damping", "Rate"]} onFrozen={onFrozen} onClose={() => undefined} />
    </QueryClientProvider>,
  );
  return { requests, onFrozen, user: userEvent.setup() };
}

afterEach(() => vi.unstubAllGlobals());

describe("freezing a revision", () => {
  it("says what is frozen and which values nobody has said the origin of, and sends what the page computed", async () => {
    const frozen = { id: "r", projectId: project.id, number: 1 };
    const { requests, onFrozen, user } = open({ [`POST ${at}`]: { status: 201, body: frozen } });
    expect(screen.getByText("sticks and slips")).toBeInTheDocument();
    expect(screen.getByText("Two values without an origin.")).toBeInTheDocument();
    expect(screen.getByText("Damping, Rate")).toBeInTheDocument();
    await user.click(screen.getByRole("button", { name: "Freeze it" }));
    await waitFor(() => expect(onFrozen).toHaveBeenCalledOnce());
    const sent = requests.find(({ method }) => method === "POST");
    expect(sent?.headers["If-Match"]).toBe('"3"');
    expect(sent?.body).toMatchObject({
      digest: subject.digest,
      units: "millimetre",
      result: { outcome: "stick-slip", eventCount: result.events.length },
    });
  });

  it("shows the server's refusal figure by figure and stays open", async () => {
    const message = "The server's own run comes to something else, so nothing was frozen.";
    const apart = { path: "result.quantities.amplitude", message: "Amplitude is 1 here and 2 on the page." };
    const { onFrozen, user } = open({ [`POST ${at}`]: refuse(422, "result-disagrees", message, [apart]) });
    await user.click(screen.getByRole("button", { name: "Freeze it" }));
    const alert = await screen.findByRole("alert");
    expect(alert).toHaveTextContent(message);
    expect(alert).toHaveTextContent(apart.message);
    expect(onFrozen).not.toHaveBeenCalled();
    expect(screen.getByRole("button", { name: "Freeze it" })).toBeEnabled();
  });
});
