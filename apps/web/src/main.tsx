import { createRoot } from "react-dom/client";
import { LoadFailed } from "./ui/load-failed.tsx";
import "./styles/app.css";

/**
 * Two pages open for people who may be on a phone with a poor signal, and for whom nothing else is loaded: signing in, and
 * the client's quote. They need neither router, cache nor schemas, so the choice is made here, before any of that loads.
 */
async function page() {
  const path = window.location.pathname.replace(/\/+$/, "");
  if (path === "/sign-in") return (await import("./routes/sign-in.tsx")).SignIn;
  if (path.startsWith("/q/")) return (await import("./routes/q.$token.tsx")).ClientQuote;
  return (await import("./app/app.tsx")).App;
}

const root = document.getElementById("root");
if (!root) throw new Error("index.html has no #root");
const screen = createRoot(root);
page().then(
  (Page) => screen.render(<Page />),
  () => screen.render(<LoadFailed />),
);
