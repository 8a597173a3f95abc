/** The only way to know what time it is. Tests pass a clock that stands still. */
export interface Clock {
  now(): Date;
}

export const systemClock: Clock = { now: () => new Date() };
