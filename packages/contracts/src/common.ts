import { z } from "zod";

/** Integer that grows by one with each save; sent as ETag, wanted back as If-Match. */
export const version = z.int().min(1);

export const instant = z.iso.datetime();
export const calendarDate = z.iso.date();
export const email = z
  .email("an e-mail address such as name@company.example")
  .max(254)
  .transform((value) => value.toLowerCase());
export const name = z.string().trim().min(1, "at least one letter").max(120, "120 characters at most");
export const shortText = z.string().trim().max(200);
export const longText = z.string().trim().max(20_000);
export const currency = z.string().regex(/^[A-Z]{3}$/);
export const unitSystem = z.enum(["inch-pound", "si"]);
export type UnitSystem = z.infer<typeof unitSystem>;
export const timeZone = z.string().min(1).max(64).refine(isTimeZone, "an IANA time zone such as America/Chicago");
/** Long enough to be hard to guess; length is what counts (NIST SP 800-63B, 5.1.1.2). */
export const newPassword = z.string().min(12, "12 characters or more").max(200, "200 characters at most");

function isTimeZone(value: string): boolean {
  try {
    new Intl.DateTimeFormat("en-US", { timeZone: value });
    return true;
  } catch {
    return false;
  }
}

export const pageQuery = z.object({
  limit: z.coerce.number<string>().int().min(1).max(200).default(50),
  after: z.string().max(200).optional(),
});
export const pageOf = <S extends z.ZodType>(item: S) => z.object({ items: z.array(item), next: z.string().nullable() });

export const address = z.object({
  line1: shortText,
  line2: shortText,
  city: shortText,
  region: shortText,
  postalCode: z.string().trim().max(20),
});
export type Address = z.infer<typeof address>;
