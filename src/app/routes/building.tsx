import { Navigate } from "react-router-dom";

/** A building opens on its survey. */
export function Component() {
  return <Navigate to="survey" replace />;
}
