import { z } from "@restband/solver";
import type { RequestHandler } from "express";
import type { Route } from "../contract.ts";
import { badRequest, Refusal } from "../errors.ts";
import { demandModest } from "./modest.ts";
import { faultsOf } from "./zod-faults.ts";

const nothing = z.strictObject({});

/** Parses parameters, query, body and `If-Match` as the contract has them, and leaves them in `response.locals`. */
export function validate(route: Route): RequestHandler {
  return (request, response, next) => {
    if (route.body && !request.is("json")) {
      throw new Refusal(415, "not-json", "The body has to be JSON, with the content type application/json.");
    }
    if (route.body) demandModest(request.body);
    Object.assign(response.locals, {
      params: parsed(route.params ?? nothing, request.params),
      query: parsed(route.query ?? nothing, request.query),
      body: route.body && parsed(route.body, request.body),
      version: route.ifMatch ? versionOf(request.get("If-Match")) : undefined,
    });
    next();
  };
}

function parsed(schema: z.ZodType, value: unknown): unknown {
  const { data, error } = schema.safeParse(value);
  if (error) throw badRequest(faultsOf(error));
  return data;
}

function versionOf(header: string | undefined): number {
  if (header === undefined) {
    throw new Refusal(428, "version-missing", 'Say which version is being replaced: If-Match: "<version>".');
  }
  const digits = /^"(\d{1,10})"$/.exec(header)?.[1];
  if (digits === undefined) {
    throw badRequest([{ path: "If-Match", message: 'A whole number in quotes is wanted, as in "3".' }]);
  }
  return Number(digits);
}
