import type { QueryClient } from "@tanstack/react-query";
import { createBrowserRouter, redirect } from "react-router-dom";
import { ScreenSkeleton } from "../ui/skeleton.tsx";
import { RouteError } from "./route-error.tsx";
import { screen } from "./screen.tsx";

/** Every address of the product. Pages come by import() when they are opened. */
export function makeRouter(client: QueryClient) {
  const page = screen(client);
  return createBrowserRouter([
    {
      HydrateFallback: ScreenSkeleton,
      ErrorBoundary: RouteError,
      children: [
        { index: true, ...page(() => import("../routes/home.tsx")) },
        { path: "sign-up", ...page(() => import("../routes/sign-up.tsx")) },
        { path: "verify-email", ...page(() => import("../routes/verify-email.tsx")) },
        { path: "reset-password", ...page(() => import("../routes/reset-password.tsx")) },
        { path: "invitations/:token", ...page(() => import("../routes/invitations.$token.tsx")) },
        {
          path: "c/:company",
          ...page(() => import("../routes/company-frame.tsx")),
          children: [
            {
              ErrorBoundary: RouteError,
              children: [
                { index: true, ...page(() => import("../routes/company-home.tsx")) },
                { path: "projects", ...page(() => import("../routes/projects.tsx")) },
                { path: "projects/new", ...page(() => import("../routes/projects.new.tsx")) },
                {
                  path: "projects/:projectId",
                  ...page(() => import("../routes/projects.$projectId.tsx")),
                  children: [
                    {
                      ErrorBoundary: RouteError,
                      children: [
                        { index: true, loader: () => redirect("layout") },
                        { path: "layout", ...page(() => import("../routes/projects.$projectId.layout.tsx")) },
                        { path: "air", ...page(() => import("../routes/projects.$projectId.air.tsx")) },
                        { path: "takeoff", ...page(() => import("../routes/projects.$projectId.takeoff.tsx")) },
                        { path: "price", ...page(() => import("../routes/projects.$projectId.price.tsx")) },
                        { path: "quote", ...page(() => import("../routes/projects.$projectId.quote.tsx")) },
                        { path: "field", ...page(() => import("../routes/projects.$projectId.field.tsx")) },
                        { path: "setup", ...page(() => import("../routes/projects.$projectId.setup.tsx")) },
                      ],
                    },
                  ],
                },
                { path: "clients", ...page(() => import("../routes/clients.tsx")) },
                {
                  path: "prices",
                  ...page(() => import("../routes/prices.tsx")),
                  children: [
                    {
                      ErrorBoundary: RouteError,
                      children: [
                        { index: true, ...page(() => import("../routes/prices.book.tsx")) },
                        { path: "rates", ...page(() => import("../routes/prices.rates.tsx")) },
                      ],
                    },
                  ],
                },
                { path: "specs", ...page(() => import("../routes/specs.tsx")) },
                { path: "specs/schedules", ...page(() => import("../routes/specs.schedules.tsx")) },
                {
                  path: "company",
                  ...page(() => import("../routes/company.tsx")),
                  children: [
                    {
                      ErrorBoundary: RouteError,
                      children: [
                        { index: true, loader: () => redirect("people") },
                        { path: "people", ...page(() => import("../routes/company.people.tsx")) },
                        { path: "settings", ...page(() => import("../routes/company.settings.tsx")) },
                        { path: "audit", ...page(() => import("../routes/company.audit.tsx")) },
                        { path: "mail", ...page(() => import("../routes/company.mail.tsx")) },
                      ],
                    },
                  ],
                },
                { path: "field", ...page(() => import("../routes/field.tsx")) },
                { path: "field/:projectId", ...page(() => import("../routes/field.$projectId.tsx")) },
                { path: "*", ...page(() => import("../routes/not-found.tsx")) },
              ],
            },
          ],
        },
        { path: "*", ...page(() => import("../routes/not-found.tsx")) },
      ],
    },
  ]);
}
