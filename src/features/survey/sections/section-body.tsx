import type { ComponentType, ReactNode } from "react";
import { Button } from "../../../components/button.tsx";
import { FootBar } from "../../../components/foot-bar.tsx";
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
  /** What comes after the last group. */
  lastAction: ReactNode;
}

/** One group of questions, with the way to the next. */
export function SectionBody({ current, onGo, lastAction }: SectionBodyProps) {
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
      <FootBar className="md:p-6">
        <div className="flex gap-3 md:justify-between">
          <Button
            kind="plain"
            disabled={!before}
            onClick={() => before && onGo(before.id)}
            className="max-md:min-h-15 max-md:basis-1/3"
          >
            Back
          </Button>
          {next ? (
            <Button onClick={() => onGo(next.id)} className="max-md:min-h-15 max-md:flex-1">
              {`Next: ${next.title}`}
            </Button>
          ) : (
            <div className="flex max-md:flex-1 max-md:[&>button]:min-h-15 max-md:[&>button]:w-full">
              {lastAction}
            </div>
          )}
        </div>
      </FootBar>
    </>
  );
}
