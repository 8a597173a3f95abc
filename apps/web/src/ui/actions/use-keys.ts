import { useEffect } from "react";
import { belongsToText, match, pressOf } from "./keys.ts";
import { allActions } from "./registry.ts";

/** Listens for the keys of all registered actions. Stands once, in the shell. */
export function useKeys() {
  useEffect(() => {
    let pending = "";
    let timer = 0;
    const forget = () => {
      pending = "";
    };
    const listen = (event: KeyboardEvent) => {
      if (event.defaultPrevented || event.isComposing || belongsToText(event)) return;
      // An open dialog or menu keeps its keys to itself.
      if (document.querySelector("[role=dialog],[role=menu]")) return;
      const found = match(allActions(), pending, pressOf(event));
      clearTimeout(timer);
      if (found === "begins") {
        pending = pending ? `${pending} ${pressOf(event)}` : pressOf(event);
        timer = window.setTimeout(forget, 1000);
        return;
      }
      forget();
      if (!found) return;
      event.preventDefault();
      found.run();
    };
    window.addEventListener("keydown", listen);
    return () => {
      clearTimeout(timer);
      window.removeEventListener("keydown", listen);
    };
  }, []);
}
