import { useEffect } from "react";
import { Link, useRouteError } from "react-router-dom";
import { buttonLook } from "../components/button.tsx";
import { PageState } from "../components/page-state.tsx";

/** A new version was served while this page was open: its old parts are gone. */
function isMissingPart(error: unknown): boolean {
  return error instanceof TypeError && /import|module/i.test(error.message);
}

export function RouteError() {
  const error = useRouteError();
  useEffect(() => {
    reportError(error);
  }, [error]);
  return (
    <main className="p-4">
      {isMissingPart(error) ? (
        <div role="alert" className="max-w-[60ch] p-6">
          <h1 className="m-0 font-sign text-xl font-bold">This page has been renewed</h1>
          <p>Load it again to go on. What was typed is kept on this device.</p>
        </div>
      ) : (
        <PageState kind="error" error={error} />
      )}
      <p className="flex flex-wrap gap-3 px-4">
        <button type="button" className={buttonLook("quiet")} onClick={() => window.location.reload()}>
          Load again
        </button>
        <Link to="/" className={buttonLook("plain")}>
          To the start
        </Link>
      </p>
    </main>
  );
}
