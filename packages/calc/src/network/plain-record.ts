/** A record while its maker fills it in. */
export type Draft<T> = { -readonly [Field in keyof T]: T[Field] };

/**
 * A maker of plain objects: what `new` answers has Object's own prototype, exactly as a literal has.
 *
 * Literals would read better. But the engine counts how many objects of each literal survive, and after a few large systems
 * whose answers are kept it makes all further ones in its old space, where making them is slow: a solve of 5,000 segments
 * then took 28 ms instead of 4 (Node 20). Objects from a constructor are not counted. For records made by the thousand only.
 */
export function plainRecord<T extends object, Inputs extends unknown[]>(
  fill: (this: Draft<T>, ...inputs: Inputs) => void,
): new (...inputs: Inputs) => T {
  fill.prototype = Object.prototype;
  return fill as unknown as new (...inputs: Inputs) => T;
}
