import type { HandlersOf } from "../route-handler.ts";
import type { ChainService } from "./chain-service.ts";

export function chainRoutes(chain: ChainService): HandlersOf<"readIntegrity"> {
  return { readIntegrity: ({ params }) => chain.read(params.projectId) };
}
