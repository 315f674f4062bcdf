import { useQuery } from "@tanstack/react-query";
import { Link, Navigate } from "react-router-dom";
import { buttonLook } from "../../components/button.tsx";
import { Wordmark } from "../../components/wordmark.tsx";
import { meQuery } from "../../lib/me-query.ts";

/** Signed in with an address that no co-operative has on its list. */
export function NoAccessScreen() {
  const { data: me } = useQuery(meQuery);
  // Whoever was put on a list meanwhile goes on.
  if (me?.activeRole) return <Navigate to="/" replace />;
  return (
    <main className="mx-auto max-w-[60ch] p-6">
      <Wordmark heightPx={44} />
      <h1 className="mt-8 font-sign text-2xl font-extrabold">This address is on nobody's list yet</h1>
      <p>
        Ask the manager of your co-operative to add you under People, with the e-mail address you have just
        used. Nothing was stored about you.
      </p>
      <p>
        <Link to="/sign-in" className={buttonLook("quiet")}>
          Sign in with another address
        </Link>
      </p>
    </main>
  );
}
