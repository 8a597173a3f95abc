/** `npm run bench`: the figures that we watch, as ratios where a machine's speed would hide them. Nothing is asserted. */
import { startWholeStack, throwawayFolder } from "@cleatwork/local-stack/stack";
import { editLatencyFigures } from "./edit-latency.ts";
import { firstLoadFigures } from "./first-load.ts";
import { isOver, table, type Figure } from "./figure.ts";
import { signIn } from "./member.ts";
import { roundTripFigures } from "./round-trips.ts";
import { secondStartFigures } from "./second-start.ts";
import { solveFigures } from "./solve.ts";
import { solveSizeFigures } from "./solve-sizes.ts";
import { takeoffFigures } from "./takeoff.ts";

// Alone first: nothing else may use the processor while it is timed.
const figures: Figure[] = [...solveFigures(), ...(await solveSizeFigures()), ...takeoffFigures()];

// Outside production the API says how often it went to the database.
const stack = await startWholeStack({ folder: throwawayFolder(), throwaway: true, env: { NODE_ENV: "test" } });
try {
  const signIns = stack.seed();
  const as = (role: string) => {
    const who = signIns.find((each) => each.role === role);
    if (!who) throw new Error(`the demo has no ${role}`);
    return signIn(stack, who);
  };
  figures.push(...(await firstLoadFigures(stack)));
  figures.push(...(await roundTripFigures(await as("owner"))));
  figures.push(...(await editLatencyFigures(await as("estimator"))));
} finally {
  await stack.stop();
}
figures.push(...(await secondStartFigures()));

console.log(`\n${table(figures)}\n`);
const over = figures.filter(isOver).length;
console.log(over === 0 ? "Everything as expected." : `${over} outside what is expected.`);
