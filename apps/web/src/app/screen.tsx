import type { QueryClient } from "@tanstack/react-query";
import { Suspense, type ComponentType } from "react";
import type { LoaderFunctionArgs, RouteObject } from "react-router-dom";
import { ScreenSkeleton } from "../ui/skeleton.tsx";

/** What a module in routes/ holds. */
export interface ScreenModule {
  readonly Component: ComponentType;
  /** Starts the requests that the screen will read. It need not wait: the screen shows its skeleton meanwhile. */
  readonly loader?: (client: QueryClient) => (args: LoaderFunctionArgs) => unknown;
  readonly Skeleton?: ComponentType;
}

/** A route whose code, and with it its requests, come when it is first opened. */
export const screen =
  (client: QueryClient) =>
  (load: () => Promise<ScreenModule>): Pick<RouteObject, "lazy"> => ({
    lazy: async () => {
      const { Component, loader, Skeleton = ScreenSkeleton } = await load();
      return {
        ...(loader ? { loader: loader(client) } : {}),
        Component: () => (
          <Suspense fallback={<Skeleton />}>
            <Component />
          </Suspense>
        ),
      };
    },
  });
