import type { Knex } from "knex";
import { fromJson } from "./columns.ts";

/**
 * A question to the database and how its rows are read. Asked alone it is a plain query; asked together with others it
 * travels in one statement, so that many answers cost one round trip and are all of one moment.
 */
export interface Question<T> {
  /** Tables, joins and conditions; neither columns nor order. */
  readonly from: Knex.QueryBuilder;
  /** The name that `read` knows → the column. */
  readonly columns: Readonly<Record<string, string>>;
  /** As after ORDER BY. */
  readonly order: string;
  // Rows have the shape that the columns say; only the asker of this question knows it.
  readonly read: (rows: readonly never[]) => T;
}

type Answers<Q> = { [K in keyof Q]: Q[K] extends Question<infer T> ? T : never };

export async function ask<T>(question: Question<T>): Promise<T> {
  const { from, columns, order, read } = question;
  const rows: readonly never[] = await from.clone().select(columns).orderByRaw(order);
  return read(rows);
}

/** Instants and days come as text here; columns.ts reads both forms. */
export async function askTogether<Q extends Readonly<Record<string, Question<unknown>>>>(
  sql: Knex,
  questions: Q,
): Promise<Answers<Q>> {
  const names = Object.keys(questions);
  const parts = names.map((name) => partOf(sql, name, questions[name]!));
  const rows = (await parts[0]!.unionAll(parts.slice(1))) as unknown as readonly AnswerRow[];

  const found = new Map<string, AnswerRow[]>(names.map((name) => [name, []]));
  for (const row of rows) found.get(row.question)!.push(row);
  const answers: Record<string, unknown> = {};
  for (const name of names) {
    const inOrder = found.get(name)!.sort((a, b) => Number(a.place) - Number(b.place));
    answers[name] = questions[name]!.read(inOrder.map(({ answer }) => fromJson<never>(answer)));
  }
  return answers as Answers<Q>;
}

interface AnswerRow {
  readonly question: string;
  readonly place: number | string;
  readonly answer: unknown;
}

/** One question's share of the common statement: its rows as JSON, each with its place in the question's order. */
function partOf(sql: Knex, name: string, { from, columns, order }: Question<unknown>): Knex.QueryBuilder {
  const entries = Object.entries(columns);
  return from
    .clone()
    .select(
      sql.raw("? as question", [name]),
      sql.raw(`row_number() over (order by ${order}) as place`),
      sql.raw(`json_object(${entries.map(() => "?, ??").join(", ")}) as answer`, entries.flat()),
    );
}
