import { render, screen } from "@testing-library/react";
import { expect, it } from "vitest";
import { BodySketch } from "../../../web/src/features/sketch/body-sketch.tsx";
import { creepFeed, solved } from "../support/scenarios.ts";
import { allowLayout } from "../support/missing-in-jsdom.ts";

allowLayout();

it("is one picture with its words, and moves with the cursor", () => {
  const { scenario, result } = solved(creepFeed);
  if (!result.samples) throw new Error("no samples");
  const { rerender } = render(<BodySketch scenario={scenario} samples={result.samples} t={0.2436} />);
  const picture = screen.getByRole("img", { name: /^Sketch\. A carriage of 120\u00a0kg .* −56\u00a0μm/ });
  expect(screen.getByText(/drawn at the cursor, 0\.2436/)).toBeInTheDocument();
  const before = picture.innerHTML;
  rerender(<BodySketch scenario={scenario} samples={result.samples} t={0.25} />);
  expect(picture.innerHTML).not.toBe(before);
  expect(screen.getByText(/drawn at the cursor, 0\.25/)).toBeInTheDocument();
});
