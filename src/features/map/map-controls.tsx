import { LocateFixed, Maximize2, Minus, Plus } from "lucide-react";
import { type ReactNode, useState } from "react";
import { useMap } from "react-leaflet";
import { useShield } from "../../components/sheet-map/use-shield.ts";

interface MapControlsProps {
  className?: string;
  /** Shows everything again; left out where there is nothing to show. */
  onAll?: () => void;
  children?: ReactNode;
}

const CLOSE_ZOOM = 13;

/** Nearer, farther, own position, everything. Leaflet must not take their clicks for clicks on the map. */
export function MapControls({ className = "", onAll, children }: MapControlsProps) {
  const map = useMap();
  const bar = useShield<HTMLDivElement>();
  const [problem, setProblem] = useState("");
  const locate = () => {
    setProblem("");
    navigator.geolocation.getCurrentPosition(
      ({ coords }) => map.setView([coords.latitude, coords.longitude], Math.max(map.getZoom(), CLOSE_ZOOM)),
      () => setProblem("This device does not tell its position."),
      { enableHighAccuracy: true, timeout: 10_000 },
    );
  };
  const cells = [
    { label: "Closer", icon: Plus, run: () => map.zoomIn() },
    { label: "Farther", icon: Minus, run: () => map.zoomOut() },
    { label: "Where I am", icon: LocateFixed, run: locate },
    ...(onAll ? [{ label: "Show every building", icon: Maximize2, run: onAll }] : []),
  ];
  return (
    <div ref={bar} className={`absolute z-[900] flex items-start gap-4 print:hidden ${className}`}>
      {problem ? (
        <p role="alert" className="m-0 max-w-52 border-l-[6px] border-straw bg-sheet p-2 text-sm">
          {problem}
        </p>
      ) : null}
      {children}
      <div className="flex flex-col border-[1.5px] border-ink bg-sheet">
        {cells.map(({ label, icon: Icon, run }) => (
          <button
            key={label}
            type="button"
            aria-label={label}
            title={label}
            className="flex size-12 items-center justify-center border-b border-rule last:border-b-0 hover:bg-trough"
            onClick={run}
          >
            <Icon size={21} aria-hidden="true" />
          </button>
        ))}
      </div>
    </div>
  );
}
