import { type ReactNode, useEffect, useId, useRef } from "react";

interface DialogProps {
  title: string;
  onClose(): void;
  children: ReactNode;
}

/** The browser's own dialog: focus stays in it, Escape closes it, and focus goes back to where it came from. */
export function Dialog({ title, onClose, children }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const id = useId();
  useEffect(() => {
    const before = document.activeElement;
    dialog.current?.showModal();
    return () => {
      if (before instanceof HTMLElement) before.focus();
    };
  }, []);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={id}
      onClose={onClose}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      className="m-auto w-[min(32rem,calc(100vw-32px))] border-2 border-ink bg-sheet p-6 text-ink max-md:mb-0"
    >
      <h2 id={id} className="m-0 font-sign text-lg font-bold">
        {title}
      </h2>
      {children}
    </dialog>
  );
}
