/** Computes away from the screen: solve, take off, price. The same code as on the server. */
import { createNumbers, type Numbers, type PricingDocuments } from "@cleatwork/layout";

export interface NumbersRequest {
  readonly turn: number;
  readonly documents: PricingDocuments;
}
export interface NumbersAnswer {
  readonly turn: number;
  readonly numbers: Numbers;
}

/** One edit follows another: what it does not touch is remembered. */
const computeNumbers = createNumbers();

self.onmessage = ({ data }: MessageEvent<NumbersRequest>) => {
  const answer: NumbersAnswer = { turn: data.turn, numbers: computeNumbers(data.documents) };
  self.postMessage(answer);
};
