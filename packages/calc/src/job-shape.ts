/** Is a parsed file built like a job at all? Types of fields only; what the values may be is for `solve` to say. */

/** A type name, a list of one shape, a shape or null, or fields by name. */
export type Shape = "string" | "number" | "boolean" | readonly [Shape] | { readonly orNull: Shape } | FieldShapes;
interface FieldShapes {
  readonly [field: string]: Shape;
}

export interface ShapeProblem {
  readonly code: "field-missing" | "field-of-wrong-type";
  /** Path into the file: "systems.0.nodes.3.id". */
  readonly field: string;
  readonly value: string;
  readonly limit: string;
}

/** Tagged unions (sections, insulation) are only objects here. */
const anyObject: Shape = {};

export const airSystemShape = {
  schema: "string",
  id: "string",
  tag: "string",
  name: "string",
  service: "string",
  design: {
    altitude_m: "number",
    temperature_k: "number",
    relativeHumidity: "number",
    availablePressure_pa: "number",
    safetyMargin: "number",
  },
  limits: {
    velocity_m_s: { main: "number", branch: "number", runout: "number" },
    frictionRate_pa_m: { main: "number", branch: "number", runout: "number" },
    flexibleLength_m: "number",
  },
  frictionBasis: "string",
  sizing: {
    method: "string",
    frictionRate_pa_m: "number",
    shape: "string",
    maximumHeight_m: { orNull: "number" },
  },
  spec: {
    material: "string",
    pressureClass_pa: "number",
    sealClass: "string",
    sectionLength_m: { rectangular: "number", round: "number", flatOval: "number" },
    rectangularJoint: "string",
    roundJoint: "string",
    rectangularSeam: "string",
    roundConstruction: "string",
    insulation: anyObject,
    hangerSpacing_m: { rectangular: "number", round: "number" },
    sizesAre: "string",
    elbow: { rectangular: "string", round: "string", radiusRatio: "number" },
    branch: { rectangular: "string", round: "string" },
    transitionAngle_rad: "number",
    flexibleSlack: "number",
  },
  levels: [{ id: "string", name: "string", elevation_m: "number" }],
  nodes: [
    {
      id: "string",
      role: "string",
      tag: "string",
      levelId: "string",
      x_m: "number",
      y_m: "number",
      elevation_m: "number",
      airflow_m3s: { orNull: "number" },
      requiredPressure_pa: { orNull: "number" },
      deviceKey: { orNull: "string" },
      spaceName: "string",
    },
  ],
  segments: [
    {
      id: "string",
      name: "string",
      fromNodeId: "string",
      toNodeId: "string",
      ductClass: "string",
      section: { orNull: anyObject },
      length_m: { orNull: "number" },
      flexible: "boolean",
      fitting: { orNull: "string" },
      accessories: ["string"],
      insulation: { orNull: anyObject },
    },
  ],
} as const satisfies Shape;

/** Every place where `value` is not built like `shape`. Fields that the shape does not name are let pass. */
export function shapeProblems(value: unknown, shape: Shape, field: string): ShapeProblem[] {
  if (value === undefined) return [{ code: "field-missing", field, value: "undefined", limit: words(shape) }];
  const wrong: ShapeProblem[] = [{ code: "field-of-wrong-type", field, value: told(value), limit: words(shape) }];
  if (typeof shape === "string") return typeof value === shape ? [] : wrong;
  if (isList(shape)) {
    if (!Array.isArray(value)) return wrong;
    return value.flatMap((item, index) => shapeProblems(item, shape[0], `${field}.${index}`));
  }
  if (isOrNull(shape)) return value === null ? [] : shapeProblems(value, shape.orNull, field);
  if (!isRecord(value)) return wrong;
  const prefix = field === "" ? "" : `${field}.`;
  return Object.entries(shape).flatMap(([name, inner]) => shapeProblems(value[name], inner, prefix + name));
}

export const isRecord = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === "object" && value !== null && !Array.isArray(value);

const isList = (shape: Shape): shape is readonly [Shape] => Array.isArray(shape);
const isOrNull = (shape: Shape): shape is { readonly orNull: Shape } => typeof shape === "object" && "orNull" in shape;

const told = (value: unknown): string =>
  isRecord(value) ? "an object" : Array.isArray(value) ? "a list" : JSON.stringify(value);

function words(shape: Shape): string {
  if (typeof shape === "string") return `a ${shape}`;
  if (isList(shape)) return "a list";
  return isOrNull(shape) ? `${words(shape.orNull)} or null` : "an object";
}
