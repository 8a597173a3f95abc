const MOST_DEGREES = 90;

type Parsed =
  | { readonly ok: true; readonly value: number }
  | { readonly ok: false; readonly problems: readonly { readonly message: string }[] };

/** "30", "30°", "30 deg": radians of a blade's turn from open. */
export function parseDegrees(typed: string): Parsed {
  const bare = typed.trim().replace(/\s*(°|deg\.?|degrees?)$/i, "");
  const value = bare === "" ? NaN : Number(bare);
  if (!Number.isFinite(value)) return refuse(`“${typed.trim()}” is not an angle. Type degrees, such as 30.`);
  if (value < 0 || value > MOST_DEGREES) return refuse(`A blade turns from 0 to ${MOST_DEGREES} degrees.`);
  return { ok: true, value: (value * Math.PI) / 180 };
}

const refuse = (message: string): Parsed => ({ ok: false, problems: [{ message }] });
