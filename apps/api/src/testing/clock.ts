import type { Clock } from "../platform/clock.ts";

/** Starts on a day of its own and moves a millisecond each time it is read, so that order is certain and days can be set. */
export class TestClock implements Clock {
  private instant = new Date("2026-12-01T18:00:00Z").getTime();

  now(): Date {
    this.instant += 1;
    return new Date(this.instant);
  }

  advanceDays(days: number): void {
    this.instant += days * 24 * 3600_000;
  }
}
