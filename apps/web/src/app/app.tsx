import { QueryClientProvider } from "@tanstack/react-query";
import { RouterProvider } from "react-router-dom";
import { Toasts } from "../ui/toast.tsx";
import { TooltipProvider } from "../ui/tooltip.tsx";
import { makeQueryClient } from "./query-client.ts";
import { makeRouter } from "./router.tsx";

const client = makeQueryClient();
const router = makeRouter(client);

export function App() {
  return (
    <QueryClientProvider client={client}>
      <TooltipProvider>
        <RouterProvider router={router} />
        <Toasts />
      </TooltipProvider>
    </QueryClientProvider>
  );
}
