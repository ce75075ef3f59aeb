import { QueryClientProvider } from "@tanstack/react-query";
import { configure, render } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { createMemoryRouter, RouterProvider } from "react-router-dom";
import { forgetToken } from "../../../web/src/api/client.ts";
import { noteConnection } from "../../../web/src/api/connection.ts";
import { makeQueryClient } from "../../../web/src/api/query-client.ts";
import { noteSessionStart } from "../../../web/src/api/session-end.ts";
import { makeRoutes } from "../../../web/src/routes.tsx";
import { allowDialogs, allowLayout } from "./missing-in-jsdom.ts";

// A page is loaded when it is first asked for, which takes a while the first time on a busy machine.
configure({ asyncUtilTimeout: 10_000 });

/** Opens the product at an address, as a browser with an empty memory does; the server is whatever fetch is. */
export function openPage(address: string) {
  forgetToken();
  noteConnection(true);
  noteSessionStart();
  allowDialogs();
  allowLayout();
  const client = makeQueryClient();
  const router = createMemoryRouter(makeRoutes(client), { initialEntries: [address] });
  render(
    <QueryClientProvider client={client}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  return { user: userEvent.setup(), address: () => router.state.location.pathname + router.state.location.search };
}
