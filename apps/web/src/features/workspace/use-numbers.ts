import type { Numbers, PricingDocuments } from "@cleatwork/layout";
import { useEffect, useRef, useState } from "react";
import type { NumbersAnswer, NumbersRequest } from "./numbers.worker.ts";

/**
 * The numbers of the documents as they are now. While one set is computed a newer one waits and older ones are dropped;
 * what is shown stays until its successor is there.
 */
export function useNumbers(documents: PricingDocuments): Numbers | null {
  const [numbers, setNumbers] = useState<Numbers | null>(null);
  const worker = useRef<Worker | null>(null);
  const turn = useRef(0);
  const busy = useRef(false);
  const next = useRef<NumbersRequest | null>(null);

  useEffect(() => {
    const made = new Worker(new URL("./numbers.worker.ts", import.meta.url), { type: "module" });
    made.onmessage = ({ data }: MessageEvent<NumbersAnswer>) => {
      setNumbers(data.numbers);
      const waiting = next.current;
      next.current = null;
      if (waiting) made.postMessage(waiting);
      else busy.current = false;
    };
    worker.current = made;
    return () => {
      made.terminate();
      worker.current = null;
      busy.current = false;
      next.current = null;
    };
  }, []);

  useEffect(() => {
    const request: NumbersRequest = { turn: ++turn.current, documents };
    if (busy.current) next.current = request;
    else {
      busy.current = true;
      worker.current?.postMessage(request);
    }
  }, [documents]);

  return numbers;
}
