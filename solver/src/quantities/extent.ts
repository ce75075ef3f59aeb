import type { Motion } from "../motion/motion.ts";
import { survey, type Survey } from "../motion/survey.ts";
import type { ChannelName, Channels } from "./channels.ts";

/**
 * Extremes, means and integrals of channels over a window of a run. The channels named beforehand are surveyed together
 * when the first of them is asked for; one not named costs a pass of its own.
 */
export class Extent {
  private readonly surveys = new Map<ChannelName, Survey>();

  constructor(
    private readonly motion: Motion,
    private readonly channels: Channels,
    readonly from: number,
    readonly to: number,
    private readonly named: readonly ChannelName[],
  ) {}

  min(name: ChannelName): number {
    return this.surveyOf(name).min(this.channels[name]);
  }

  max(name: ChannelName): number {
    return this.surveyOf(name).max(this.channels[name]);
  }

  /** Larger of |min| and |max|. */
  peak(name: ChannelName): number {
    return this.surveyOf(name).peak(this.channels[name]);
  }

  /** Half peak-to-peak. */
  halfSwing(name: ChannelName): number {
    return (this.max(name) - this.min(name)) / 2;
  }

  integral(name: ChannelName): number {
    return this.surveyOf(name).integral(this.channels[name]);
  }

  /** Mean over time; the value itself where the window is an instant. */
  mean(name: ChannelName): number {
    const { from, to } = this;
    return to > from ? this.integral(name) / (to - from) : this.max(name);
  }

  private surveyOf(name: ChannelName): Survey {
    return this.surveys.get(name) ?? this.survey(this.named.includes(name) ? this.named : [name], name);
  }

  private survey(names: readonly ChannelName[], wanted: ChannelName): Survey {
    const made = survey(
      this.motion,
      this.from,
      this.to,
      names.map((name) => this.channels[name]),
    );
    for (const name of [...names, wanted]) this.surveys.set(name, made);
    return made;
  }
}
