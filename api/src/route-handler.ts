import type { z } from "@restband/solver";
import type { Request } from "express";
import type { Account, Role, Route, RouteName, routes } from "./contract.ts";
import type { permissions } from "./middleware/permit.ts";

type Routes = typeof routes;
type Output<Schema> = Schema extends z.ZodType ? z.output<Schema> : undefined;
type Member<N extends RouteName, Key extends keyof Route> = Key extends keyof Routes[N] ? Routes[N][Key] : undefined;

/** Who asks, as far as the route's permission tells: signed in at all, and with which role in the project asked for. */
type Caller<N extends RouteName> = (typeof permissions)[N] extends "public"
  ? unknown
  : (typeof permissions)[N] extends "signed-in"
    ? { readonly account: Account }
    : { readonly account: Account; readonly role: Role };

/** A request as its handler sees it: checked against the contract, its caller known and permitted. */
export type Call<N extends RouteName> = Caller<N> & {
  readonly params: Output<Member<N, "params">>;
  readonly query: Output<Member<N, "query">>;
  readonly body: Output<Member<N, "body">>;
  /** The number in `If-Match`, where the route asks for one. */
  readonly version: Member<N, "ifMatch"> extends true ? number : undefined;
  /** For the session alone. */
  readonly request: Request;
};

type Answer<N extends RouteName> = Member<N, "response"> extends z.ZodType ? z.input<Member<N, "response">> : void;

export type Handler<N extends RouteName> = (call: Call<N>) => Promise<Answer<N>>;

/** One handler for each of the named routes; all resources together must give all of them, or the server does not compile. */
export type HandlersOf<Names extends RouteName> = { readonly [N in Names]: Handler<N> };
export type Handlers = HandlersOf<RouteName>;
