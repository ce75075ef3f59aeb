import { useQueryClient } from "@tanstack/react-query";
import { useEffect } from "react";
import { call } from "../api/client.ts";
import { useLostSince } from "../api/connection.ts";
import { sayClock } from "../format/words.ts";

const everyMs = 3000;

/** Over the page, so that nothing shifts: says that no server answers and since when, asks again until one does, then has everything on the page read anew. */
export function ConnectionLine() {
  const lostSince = useLostSince();
  const client = useQueryClient();
  useEffect(() => {
    if (!lostSince) return;
    const timer = setInterval(() => void call("readSession", {}).catch(() => undefined), everyMs);
    return () => {
      clearInterval(timer);
      void client.invalidateQueries();
    };
  }, [lostSince, client]);
  return (
    <div role="status" className="fixed inset-x-0 top-0 z-10 print:hidden [#root:has(>header)_&]:top-(--header)">
      {lostSince && (
        <p className="border-b-2 border-broken bg-raised">
          <span className="page-width block py-2">
            No answer from the server since {sayClock(lostSince)}. Trying again; what you typed stays.
          </span>
        </p>
      )}
    </div>
  );
}
