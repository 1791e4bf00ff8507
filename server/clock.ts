/**
 * The one clock of the server. Everything else takes the time from here, so
 * that a test can set it and a service never mixes two readings of "now".
 */
class Clock {
  #fixed: Date | null = null;

  now(): Date {
    return this.#fixed === null ? new Date() : new Date(this.#fixed);
  }

  /** Stops the clock at an instant; `null` lets it run again. Tests only. */
  set(instant: Date | string | null): void {
    this.#fixed = instant === null ? null : new Date(instant);
  }

  /** Moves a stopped (or running, which stops it) clock by some milliseconds. Tests only. */
  advance(milliseconds: number): void {
    this.#fixed = new Date(this.now().getTime() + milliseconds);
  }
}

export const clock = new Clock();
