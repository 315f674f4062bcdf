import { useEffect, useState } from "react";
import { ApiError, ConnectionError } from "../lib/api-client.ts";
import { Button } from "./button.tsx";

type PageStateProps =
  | { kind: "loading"; words?: string }
  | { kind: "error"; error: unknown; onRetry?: () => void }
  | { kind: "empty"; title: string; words: string };

/** Nothing is said before this, so that quick answers do not flicker. */
const QUIET_MS = 400;

function Loading({ words = "Fetching the sheet" }: { words?: string }) {
  const [late, setLate] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setLate(true), QUIET_MS);
    return () => clearTimeout(timer);
  }, []);
  return (
    <p role="status" className="m-0 min-h-24 p-6 text-ink-2">
      {late ? words : ""}
    </p>
  );
}

function words(error: unknown): { title: string; text: string } {
  if (error instanceof ConnectionError) {
    return {
      title: "No connection",
      text: "What was typed here stays on this device. Try again when there is signal.",
    };
  }
  if (error instanceof ApiError) {
    const titles: Record<number, string> = {
      401: "Please sign in again",
      403: "This is not open to you",
      404: "Not found",
      429: "A moment, please",
    };
    return { title: titles[error.status] ?? "That did not work", text: error.message };
  }
  return {
    title: "That did not work",
    text: "Nothing was changed. Try again, and ring the co-op office if it goes on.",
  };
}

/** What stands where a sheet cannot be shown: being fetched, failed, or empty. */
export function PageState(props: PageStateProps) {
  if (props.kind === "loading") return <Loading words={props.words} />;
  if (props.kind === "empty") {
    return (
      <div className="max-w-[60ch] p-6">
        <h2 className="m-0 font-sign text-xl font-bold">{props.title}</h2>
        <p>{props.words}</p>
      </div>
    );
  }
  const { title, text } = words(props.error);
  return (
    <div role="alert" className="m-4 max-w-[60ch] border-l-[6px] border-redlead bg-sheet p-6">
      <h2 className="m-0 font-sign text-xl font-bold">{title}</h2>
      <p>{text}</p>
      {props.onRetry ? (
        <Button kind="quiet" onClick={props.onRetry}>
          Try again
        </Button>
      ) : null}
    </div>
  );
}
