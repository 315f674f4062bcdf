import type { ButtonHTMLAttributes } from "react";

type ButtonKind = "primary" | "quiet" | "plain" | "decline";

const looks: Record<ButtonKind, string> = {
  primary: "border-2 border-bottle bg-bottle text-on-bottle hover:border-bottle-deep hover:bg-bottle-deep",
  quiet: "border-2 border-bottle bg-sheet text-bottle hover:bg-trough",
  plain: "border-[1.5px] border-rule-strong bg-sheet text-ink hover:bg-trough",
  decline: "border-2 border-redlead bg-sheet text-redlead hover:bg-redlead-tint",
};

/** The classes of a button, for links that look like one. */
export function buttonLook(kind: ButtonKind = "primary"): string {
  return `inline-flex min-h-11 items-center justify-center gap-2 rounded-control px-4 font-bold no-underline pointer-coarse:min-h-12 disabled:border-rule disabled:bg-trough disabled:text-ink-2 ${looks[kind]}`;
}

interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  kind?: ButtonKind;
  /** The label turns to "Working…" and the width holds. */
  busy?: boolean;
}

export function Button({
  kind = "primary",
  busy = false,
  children,
  className = "",
  type = "button",
  ...rest
}: ButtonProps) {
  return (
    <button
      type={type}
      className={`${buttonLook(kind)} ${className}`}
      aria-busy={busy}
      {...rest}
      disabled={rest.disabled || busy}
    >
      {busy ? "Working…" : children}
    </button>
  );
}
