import type { ReactNode } from "react";
import "./foot-bar.css";

interface FootBarProps {
  children: ReactNode;
  /** Classes for the bar where it stands in the page, from 768 pixels up. */
  className?: string;
}

/** A screen's actions: in the page on a desk, fixed within reach of the thumb on a phone. */
export function FootBar({ children, className = "" }: FootBarProps) {
  return (
    <div
      data-foot-bar=""
      className={`max-md:fixed max-md:inset-x-0 max-md:bottom-0 max-md:z-[1200] max-md:max-h-[80dvh] max-md:overflow-y-auto max-md:border-t-2 max-md:border-ink max-md:bg-sheet max-md:p-4 max-md:pb-[max(16px,env(safe-area-inset-bottom))] print:hidden ${className}`}
    >
      {children}
    </div>
  );
}
