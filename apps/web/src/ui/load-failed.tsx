import { Button } from "./button.tsx";

/** The page's code did not come: no connection, or a newer version stands in its place. */
export function LoadFailed() {
  return (
    <main className="p-4">
      <title>Not loaded, Cleatwork</title>
      <div role="alert" className="hem max-w-xl p-4">
        <h1 className="text-title">This page could not be loaded</h1>
        <p className="mt-1 text-ink-2">There is no connection, or Cleatwork was just renewed. Nothing is lost.</p>
        <Button rank="primary" className="mt-3" onClick={() => window.location.reload()}>
          Load it again
        </Button>
      </div>
    </main>
  );
}
