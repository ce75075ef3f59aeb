import type { Motion } from "../motion/motion.ts";
import { emptyState } from "../motion/state.ts";
import type { Survey } from "../motion/survey.ts";
import type { AnyChannel, ChannelName, Channels } from "./channels.ts";

/** An integral below this share of ∫ |channel| dt is the rounding of a sum of panels, and 0. */
const rounding = 1e-14;

/**
 * Extremes, means and integrals of channels over a window of a run. The channels named beforehand are surveyed together
 * when the first of them is asked for; one not named costs a pass of its own.
 */
export class Extent {
  private readonly surveys = new Map<AnyChannel, Survey>();

  constructor(
    private readonly motion: Motion,
    private readonly channels: Channels,
    readonly from: number,
    readonly to: number,
    private readonly named: readonly AnyChannel[],
  ) {}

  min(name: ChannelName): number {
    return this.surveyOf(name).min(this.channels.of(name));
  }

  max(name: ChannelName): number {
    return this.surveyOf(name).max(this.channels.of(name));
  }

  /** Larger of |min| and |max|. */
  peak(name: ChannelName): number {
    return this.surveyOf(name).peak(this.channels.of(name));
  }

  /** Half peak-to-peak. */
  halfSwing(name: ChannelName): number {
    return (this.max(name) - this.min(name)) / 2;
  }

  /** ∫ dt over the window; 0 where rounding is all there is of it. */
  integral(name: AnyChannel): number {
    const surveyed = this.surveyOf(name);
    const channel = this.channels.of(name);
    const integral = surveyed.integral(channel);
    return Math.abs(integral) <= rounding * surveyed.gross(channel) ? 0 : integral;
  }

  /** Mean over time; the value itself where the window is an instant. */
  mean(name: AnyChannel): number {
    const { from, to } = this;
    return to > from ? this.integral(name) / (to - from) : this.valueAt(to, name);
  }

  private valueAt(t: number, name: AnyChannel): number {
    const state = emptyState();
    this.motion.read(this.motion.find(t), t, state);
    return this.channels.of(name)(state);
  }

  private surveyOf(name: AnyChannel): Survey {
    const made = this.surveys.get(name);
    if (made !== undefined) return made;
    const together = this.named.includes(name) ? this.named : [name];
    const survey = this.channels.survey(this.motion, this.from, this.to, together);
    for (const each of together) this.surveys.set(each, survey);
    return survey;
  }
}
