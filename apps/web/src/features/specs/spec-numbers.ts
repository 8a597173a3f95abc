import { parsePressure } from "@cleatwork/calc/display/index";
import { pascals, type Pascals } from "@cleatwork/calc";
import type { UnitSystem } from "@cleatwork/contracts";
import type { Understood } from "../../ui/quantity-field.tsx";

type Numeric = {
  readonly parse: (text: string) => Understood<number>;
  readonly format: (value: number) => { readonly text: string; readonly value: string; readonly unit: string };
};

const shortest = (value: number) => String(Number(value.toFixed(3)));

function read(text: string, unit: RegExp, example: string, toValue: (typed: number) => number): Understood<number> {
  const bare = text.trim().replace(unit, "").trim();
  const value = bare === "" ? NaN : Number(bare);
  return Number.isFinite(value)
    ? { ok: true, value: toValue(value) }
    : { ok: false, problems: [{ message: `“${text.trim()}” is not a number. Type one such as ${example}.` }] };
}

export const plainNumber = (unit: string, example: string): Numeric => ({
  parse: (text) => read(text, /[×x].*$/i, example, (typed) => typed),
  format: (value) => ({ text: `${shortest(value)} ${unit}`, value: shortest(value), unit }),
});

export const degrees: Numeric = {
  parse: (text) => read(text, /°|deg.*$/i, "30", (typed) => (typed * Math.PI) / 180),
  format: (value) => {
    const shown = shortest((value * 180) / Math.PI);
    return { text: `${shown}°`, value: shown, unit: "°" };
  },
};

export const percent: Numeric = {
  parse: (text) => read(text, /%$/, "4", (typed) => typed / 100),
  format: (value) => {
    const shown = shortest(value * 100);
    return { text: `${shown} %`, value: shown, unit: "%" };
  },
};

/** A pressure class may be negative, for duct under suction; pressures elsewhere may not. */
export function parsePressureClass(text: string, units: UnitSystem): Understood<Pascals> {
  const suction = /^\s*[-\u2212\u2013]\s*(.*)$/.exec(text);
  const read = parsePressure(suction?.[1] ?? text, units);
  return read.ok && suction ? { ok: true, value: pascals(0 - read.value) } : read;
}
