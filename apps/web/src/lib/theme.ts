import { useSyncExternalStore } from "react";

export const THEMES = ["system", "light", "dark"] as const;
export type Theme = (typeof THEMES)[number];

const read = (): Theme => {
  const stored = localStorage.getItem("theme");
  return stored === "light" || stored === "dark" ? stored : "system";
};

/** The choice is kept on this computer; /theme.js applies it before the first paint and whenever it changes. */
export function setTheme(theme: Theme) {
  if (theme === "system") localStorage.removeItem("theme");
  else localStorage.setItem("theme", theme);
  window.dispatchEvent(new Event("themechange"));
}

export const useTheme = (): Theme =>
  useSyncExternalStore((listener) => {
    window.addEventListener("themechange", listener);
    window.addEventListener("storage", listener);
    return () => {
      window.removeEventListener("themechange", listener);
      window.removeEventListener("storage", listener);
    };
  }, read);
