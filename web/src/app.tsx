import { QueryClientProvider } from "@tanstack/react-query";
import { RouterProvider } from "react-router-dom";
import { makeQueryClient } from "./api/query-client.ts";
import { makeRouter } from "./routes.tsx";

const client = makeQueryClient();
const router = makeRouter(client);

/** The whole page: the server's copy of things, and the router that chooses what is shown. */
export function App() {
  return (
    <QueryClientProvider client={client}>
      <RouterProvider router={router} />
    </QueryClientProvider>
  );
}
