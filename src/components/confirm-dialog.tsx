import type { ReactNode } from "react";
import { ApiError } from "../lib/api-client.ts";
import { Button } from "./button.tsx";
import { Dialog } from "./dialog.tsx";

interface ConfirmDialogProps {
  title: string;
  /** What will happen, and what stays as it is. */
  children: ReactNode;
  /** What the button does, in a verb. */
  action: string;
  busy: boolean;
  error: Error | null;
  onConfirm(): void;
  onClose(): void;
}

/** Asks once more before something is taken away. */
export function ConfirmDialog(props: ConfirmDialogProps) {
  const { title, children, action, busy, error, onConfirm, onClose } = props;
  const sentence =
    error instanceof ApiError ? (Object.values(error.fields)[0] ?? error.message) : error?.message;
  return (
    <Dialog title={title} onClose={onClose}>
      <div className="my-3">{children}</div>
      {sentence ? (
        <p role="alert" className="border-l-[6px] border-redlead bg-redlead-tint p-3">
          {sentence}
        </p>
      ) : null}
      <div className="flex flex-wrap gap-3">
        <Button kind="decline" busy={busy} onClick={onConfirm}>
          {action}
        </Button>
        <Button kind="plain" onClick={onClose}>
          Leave it
        </Button>
      </div>
    </Dialog>
  );
}
