import L, { type Map as LeafletMap } from "leaflet";
import { Spline } from "lucide-react";
import { useState } from "react";
import { useNavigate, useSearchParams } from "react-router-dom";
import type { BuildingSummary } from "../../../../server/contracts/buildings.ts";
import type { FarmView } from "../../../../server/contracts/farms.ts";
import type { UnitSystem } from "../../../../server/engine/units.ts";
import { Button } from "../../../components/button.tsx";
import { SheetMap } from "../../../components/sheet-map/sheet-map.tsx";
import { corners, type GroundPoint, latLng } from "../../../lib/footprint.ts";
import { PHONE, useMedia } from "../../../lib/use-media.ts";
import { usePinBuilding } from "../api/pin-building.ts";
import { Footprints } from "../boards/footprints.tsx";
import { houseFromClicks } from "../geometry/three-clicks.ts";
import { MapControls } from "../map-controls.tsx";
import { PhoneSheet } from "../phone-sheet.tsx";
import { ClickHint } from "./click-hint.tsx";
import { MapClicks } from "./map-clicks.tsx";
import { emptyDraft, footprintOf, type PinDraft, withFootprint } from "./pin-draft.ts";
import { PinForm } from "./pin-form.tsx";
import { asksWhetherFar, missingParts, sortRefusal } from "./pin-problems.ts";
import { PlanOnMap } from "./plan-on-map.tsx";
import { StationLine } from "./station-line.tsx";

const FARM_ZOOM = 13;
const TOWN_ZOOM = 12;
/** Room around the house, and no closer than a yard. */
const CLOSE_UP = { padding: [150, 150] as [number, number], maxZoom: 19 };
const WORLD = { center: [25, 10] as [number, number], zoom: 2 };

interface PinPageProps {
  farms: FarmView[];
  buildings: BuildingSummary[];
  cooperativeId: string | null;
  system: UnitSystem;
}

/** Form at the left, map at the right; what is changed in one shows in the other. */
export function PinPage({ farms, buildings, cooperativeId, system }: PinPageProps) {
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const phone = useMedia(PHONE);
  const pin = usePinBuilding();
  const [map, setMap] = useState<LeafletMap | null>(null);
  const [tried, setTried] = useState(false);
  const [clicks, setClicks] = useState<GroundPoint[] | null>(null);
  const [only] = farms;
  const first =
    farms.find((farm) => farm.id === search.get("farm")) ?? (farms.length === 1 ? only : undefined);
  const [draft, keepDraft] = useState<PinDraft>(() => emptyDraft(first?.id ?? "", system));
  const setDraft = (next: PinDraft) => {
    keepDraft(next);
    // A refusal speaks of the answers as they were sent.
    if (pin.isError) pin.reset();
  };
  const look = (place: GroundPoint, zoom = TOWN_ZOOM) => map?.setView(latLng(place), zoom);
  const clicked = (point: GroundPoint) => {
    if (clicks === null) return setDraft({ ...draft, position: point });
    const [one, two, three] = [...clicks, point];
    if (one === undefined || two === undefined || three === undefined) return setClicks([...clicks, point]);
    const { middle, footprint } = houseFromClicks([one, two, three]);
    setDraft({ ...withFootprint(draft, footprint), position: middle });
    setClicks(null);
  };
  const missing = tried ? missingParts(draft) : {};
  const { fields, refusal } = sortRefusal(pin.error);
  const asksFar = asksWhetherFar(pin.error);
  const save = (farFromFarmConfirmed: boolean) => {
    setTried(true);
    if (Object.keys(missingParts(draft)).length > 0) return pin.reset();
    pin.mutate(
      { draft, farFromFarmConfirmed },
      { onSuccess: (building) => navigate(`/buildings/${building.id}/survey`) },
    );
  };
  const footprint = footprintOf(draft);
  const closeUp = () => {
    if (draft.position === null || footprint === null) return;
    map?.fitBounds(L.latLngBounds(corners(draft.position, footprint).map(latLng)), CLOSE_UP);
  };
  return (
    <div className="relative min-h-130 flex-1">
      <div className="absolute inset-0 max-md:flex max-md:flex-col md:grid md:grid-cols-[minmax(380px,464px)_minmax(0,1fr)]">
        <PhoneSheet label="Form">
          <PinForm
            draft={draft}
            onDraft={setDraft}
            farms={farms}
            cooperativeId={cooperativeId}
            onFarm={(farm) => {
              setDraft({ ...draft, farmId: farm.id });
              if (draft.position === null) look(farm, FARM_ZOOM);
            }}
            onLook={look}
            problems={{ ...fields, ...missing }}
            refusal={
              Object.keys(missing).length > 0 ? "Some answers are missing. See the marked ones." : refusal
            }
            asksFar={asksFar}
            busy={pin.isPending}
            backTo={search.has("farm") && first ? `/farms/${first.id}` : "/map"}
            onSave={save}
          />
        </PhoneSheet>
        <SheetMap
          label="Map"
          center={first ? latLng(first) : WORLD.center}
          zoom={first ? FARM_ZOOM : WORLD.zoom}
          framed={!phone}
          onMap={setMap}
        >
          <Footprints buildings={buildings} chosenId={null} />
          <MapClicks onClick={clicked} />
          <ClickHint
            drawing={clicks === null ? null : (clicks.length as 0 | 1 | 2)}
            placed={draft.position !== null}
          />
          {draft.position === null ? null : (
            <>
              <StationLine position={draft.position} />
              <PlanOnMap
                position={draft.position}
                footprint={footprint}
                onMove={(position) => setDraft({ ...draft, position })}
                onResize={(change) => setDraft(withFootprint(draft, change))}
              />
            </>
          )}
          <MapControls className={phone ? "top-2 right-2" : "top-11 right-6"}>
            <div className="flex gap-3 max-md:hidden">
              <Button kind="plain" onClick={() => setClicks(clicks === null ? [] : null)}>
                <Spline size={18} aria-hidden="true" />
                {clicks === null ? "Draw with three clicks" : "Stop drawing"}
              </Button>
              {draft.position === null ? null : (
                <Button kind="plain" onClick={closeUp}>
                  Show close up
                </Button>
              )}
            </div>
          </MapControls>
        </SheetMap>
      </div>
    </div>
  );
}
