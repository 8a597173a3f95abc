/** The built product with its demo, for one journey at a time. */
import { test as base } from "@playwright/test";
import { startWholeStack, throwawayFolder, type SignIn, type WholeStack } from "@cleatwork/local-stack/stack";

export interface Product {
  readonly stack: WholeStack;
  readonly url: string;
  readonly mailUrl: string;
  readonly signIn: (role: string) => SignIn;
}

export const test = base.extend<object, { product: Product }>({
  product: [
    // Playwright wants its fixtures as a pattern, even an empty one.
    // eslint-disable-next-line no-empty-pattern
    async ({}, use) => {
      const stack = await startWholeStack({ folder: throwawayFolder(), throwaway: true });
      try {
        const signIns = stack.seed();
        await use({
          stack,
          url: stack.publicUrl,
          mailUrl: stack.mailUrl,
          signIn: (role) => {
            const who = signIns.find((each) => each.role === role);
            if (!who) throw new Error(`the demo has no ${role}`);
            return who;
          },
        });
      } finally {
        await stack.stop();
      }
    },
    { scope: "worker", timeout: 180_000 },
  ],
});
export { expect } from "@playwright/test";
