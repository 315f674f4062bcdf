import { useQuery } from "@tanstack/react-query";
import { Navigate } from "react-router-dom";
import type { Role } from "../../server/contracts/people.ts";
import { meQuery } from "../lib/me-query.ts";

const firstPage: Record<Role, string> = { advisor: "/map", farmer: "/reviews", manager: "/sites" };

/** Where each role's work begins. */
export function Start() {
  const { data: me } = useQuery(meQuery);
  if (me === undefined) return null;
  return <Navigate to={me.activeRole === null ? "/no-access" : firstPage[me.activeRole]} replace />;
}
