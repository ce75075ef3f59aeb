import type { Motion } from "../motion/motion.ts";
import { emptyState } from "../motion/state.ts";
import type { Survey } from "../motion/survey.ts";
import type { AnyChannel, ChannelName, Channels } from "./channels.ts";

/** An integral below this share of ∫ |channel| dt is the rounding of a sum of panels, and 0. */
const rounding = 1e-14;

/**
 * A stretch of a run. The channels named beforehand are surveyed together when the first of them is asked for; one not named
 * costs a pass of its own.
 */
export class Strip {
  private readonly surveys = new Map<AnyChannel, Survey>();

  constructor(
    readonly motion: Motion,
    readonly channels: Channels,
    readonly from: number,
    readonly to: number,
    private readonly named: readonly AnyChannel[],
  ) {}

  surveyOf(name: AnyChannel): Survey {
    const made = this.surveys.get(name);
    if (made !== undefined) return made;
    const together = this.named.includes(name) ? this.named : [name];
    const survey = this.channels.survey(this.motion, this.from, this.to, together);
    for (const each of together) this.surveys.set(each, survey);
    return survey;
  }
}

/** Extremes, means and integrals of channels over a window of a run: strips one after another, one at least. */
export class Extent {
  constructor(private readonly strips: readonly Strip[]) {}

  min(name: ChannelName): number {
    return this.strips.reduce(
      (min, strip) => Math.min(min, strip.surveyOf(name).min(strip.channels.of(name))),
      Infinity,
    );
  }

  max(name: ChannelName): number {
    return this.strips.reduce(
      (max, strip) => Math.max(max, strip.surveyOf(name).max(strip.channels.of(name))),
      -Infinity,
    );
  }

  /** Larger of |min| and |max|. */
  peak(name: ChannelName): number {
    return Math.max(Math.abs(this.min(name)), Math.abs(this.max(name)));
  }

  /** Half peak-to-peak. */
  halfSwing(name: ChannelName): number {
    return (this.max(name) - this.min(name)) / 2;
  }

  /** ∫ dt over the window; 0 where rounding is all there is of it. */
  integral(name: AnyChannel): number {
    let integral = 0;
    let gross = 0;
    for (const strip of this.strips) {
      const channel = strip.channels.of(name);
      integral += strip.surveyOf(name).integral(channel);
      gross += strip.surveyOf(name).gross(channel);
    }
    return Math.abs(integral) <= rounding * gross ? 0 : integral;
  }

  /** Mean over time; the value itself where the window is an instant. */
  mean(name: AnyChannel): number {
    const [first] = this.strips;
    const { to } = this.strips[this.strips.length - 1];
    return to > first.from ? this.integral(name) / (to - first.from) : valueAt(first, to, name);
  }
}

function valueAt({ motion, channels }: Strip, t: number, name: AnyChannel): number {
  const state = emptyState();
  motion.read(motion.find(t), t, state);
  return channels.of(name)(state);
}
