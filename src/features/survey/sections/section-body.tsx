import type { ComponentType } from "react";
import { AirSection } from "./air-section.tsx";
import { CoverSection } from "./cover-section.tsx";
import { FloorSection } from "./floor-section.tsx";
import { HeatersSection } from "./heaters-section.tsx";
import { type SectionId, surveySections } from "./section-list.ts";
import { ShapeSection } from "./shape-section.tsx";
import { TemperaturesSection } from "./temperatures-section.tsx";
import { UseSection } from "./use-section.tsx";

const bodies: Record<SectionId, ComponentType> = {
  shape: ShapeSection,
  cover: CoverSection,
  air: AirSection,
  floor: FloorSection,
  use: UseSection,
  temperatures: TemperaturesSection,
  heaters: HeatersSection,
};

interface SectionBodyProps {
  current: SectionId;
  onGo: (id: SectionId) => void;
}

/** One group of questions, with the way to the next. */
export function SectionBody({ current, onGo }: SectionBodyProps) {
  const Body = bodies[current];
  const index = surveySections.findIndex((section) => section.id === current);
  const before = surveySections[index - 1];
  const next = surveySections[index + 1];
  return (
    <>
      <div className="flex-1 md:px-6 md:pt-4">
        <h2 className="m-0 pb-2 font-sign text-lg font-bold max-md:sr-only">
          {surveySections[index]?.title}
        </h2>
        <Body />
      </div>
      <div className="flex gap-3 bg-sheet p-4 max-md:fixed max-md:inset-x-0 max-md:bottom-0 max-md:z-10 max-md:border-t-2 max-md:border-ink md:justify-between md:px-6">
        <button
          type="button"
          disabled={!before}
          onClick={() => before && onGo(before.id)}
          className="min-h-11 rounded-control border-2 border-rule-strong bg-sheet px-4 font-bold hover:bg-trough disabled:border-rule disabled:text-ink-2 disabled:hover:bg-sheet max-md:min-h-15 max-md:basis-1/3"
        >
          Back
        </button>
        {next ? (
          <button
            type="button"
            onClick={() => onGo(next.id)}
            className="min-h-11 rounded-control bg-bottle px-4 font-bold text-on-bottle hover:bg-bottle-deep max-md:min-h-15 max-md:flex-1"
          >
            {`Next: ${next.title}`}
          </button>
        ) : (
          <p className="m-0 self-center text-sm text-ink-2">That was the last group.</p>
        )}
      </div>
    </>
  );
}
