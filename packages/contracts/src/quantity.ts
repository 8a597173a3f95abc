/** zod schemas for SI quantities: a finite number that carries its unit in the type. */
import type { CubicMetersPerSecond, Kelvins, Meters, MetersPerSecond, Pascals, PascalsPerMeter } from "@cleatwork/calc";
import { z } from "zod";

const quantity = <Q extends number>(schema: z.ZodNumber) => schema as unknown as z.ZodType<Q, Q>;

export const metersSchema = quantity<Meters>(z.number().min(-100_000).max(100_000));
export const positiveMetersSchema = quantity<Meters>(z.number().positive().max(100_000));
export const notNegativeMetersSchema = quantity<Meters>(z.number().min(0).max(100_000));
export const airflowSchema = quantity<CubicMetersPerSecond>(z.number().min(0).max(10_000));
export const velocitySchema = quantity<MetersPerSecond>(z.number().positive().max(200));
export const pascalsSchema = quantity<Pascals>(z.number().min(-100_000).max(100_000));
export const notNegativePascalsSchema = quantity<Pascals>(z.number().min(0).max(100_000));
export const frictionRateSchema = quantity<PascalsPerMeter>(z.number().positive().max(10_000));
export const kelvinsSchema = quantity<Kelvins>(z.number().min(150).max(1500));
