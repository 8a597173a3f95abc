/** What a quantity may be at all. Wider than any good design: limits of design are findings, not problems. */
export interface Range {
  /** Smallest accepted, or the bound itself when `open`. */
  readonly from: number;
  readonly to: number;
  /** The lower bound itself is refused. */
  readonly open: boolean;
  readonly words: string;
}

const over = (from: number, to: number, words: string): Range => ({ from, to, open: true, words });
const within = (from: number, to: number, words: string): Range => ({ from, to, open: false, words });

/** Reason for every bound: a bigger figure is a slip of units or of the keyboard, not a duct. */
export const ranges = {
  side: over(0, 10, "more than 0 and at most 10 m"),
  length: over(0, 10_000, "more than 0 and at most 10,000 m"),
  airflow: over(0, 1_000, "more than 0 and at most 1,000 m³/s"),
  outletPressure: within(0, 25_000, "from 0 to 25,000 Pa"),
  position: within(-1e5, 1e5, "within 100 km of the origin"),
  altitude: within(-500, 11_000, "from −500 to 11,000 m"),
  temperature: within(220, 470, "from 220 to 470 K"),
  relativeHumidity: within(0, 1, "from 0 to 1"),
  availablePressure: within(0, 25_000, "from 0 to 25,000 Pa"),
  safetyMargin: within(0, 0.5, "from 0 to 0.5"),
  velocityLimit: over(0, 150, "more than 0 and at most 150 m/s"),
  frictionLimit: over(0, 1_000, "more than 0 and at most 1,000 Pa/m"),
  radiusRatio: within(0.5, 5, "from 0.5 to 5"),
  transitionAngle: over(0, Math.PI, "more than 0 and at most π rad"),
  flexibleSlack: within(0, 0.5, "from 0 to 0.5"),
  damperAngle: within(0, Math.PI / 2, "from 0 to π/2 rad"),
  pressureClass: within(-25_000, 25_000, "from −25,000 to 25,000 Pa"),
  insulationThickness: over(0, 0.5, "more than 0 and at most 0.5 m"),
} satisfies Record<string, Range>;

export const isIn = (range: Range, value: number): boolean =>
  range.open ? value > range.from && value <= range.to : value >= range.from && value <= range.to;
