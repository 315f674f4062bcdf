import { type FormEvent, type ReactNode, useEffect, useRef } from "react";
import { Link } from "react-router-dom";
import type { FarmView } from "../../../../server/contracts/farms.ts";
import { Button, buttonLook } from "../../../components/button.tsx";
import { PlaceSearch } from "../../../components/place-search.tsx";
import { PositionFields } from "../../../components/position-fields.tsx";
import { Segmented } from "../../../components/segmented.tsx";
import { TextField } from "../../../components/text-field.tsx";
import { compass } from "../../../lib/format.ts";
import { quantitySi } from "../../../lib/quantity-value.ts";
import { FarmChoice } from "./farm-choice.tsx";
import { type PinDraft, withKind } from "./pin-draft.ts";
import { PinQuantity } from "./pin-quantity.tsx";
import { ShapeChoice } from "./shape-choice.tsx";
import { StationCard } from "./station-card.tsx";

const kinds = [
  { value: "greenhouse" as const, label: "Glass and film" },
  { value: "barn" as const, label: "Stock barn" },
];

interface PinFormProps {
  draft: PinDraft;
  onDraft(draft: PinDraft): void;
  farms: FarmView[];
  cooperativeId: string | null;
  onFarm(farm: FarmView): void;
  /** Looks at a place without pinning it. */
  onLook(place: { latitudeDeg: number; longitudeDeg: number }): void;
  problems: Record<string, string>;
  /** A refusal that belongs to no field. */
  refusal: string | null;
  /** True once the server has asked whether a far place is meant. */
  asksFar: boolean;
  busy: boolean;
  /** Where the person came from. */
  backTo: string;
  onSave(farFromFarmConfirmed: boolean): void;
}

function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="grid gap-4 border-b border-rule-strong px-5 py-4">
      <h2 className="m-0 font-sign text-lg font-bold">{title}</h2>
      {children}
    </section>
  );
}

function bearingHint(draft: PinDraft): string {
  const deg = quantitySi(draft.ridgeBearing);
  return Number.isFinite(deg)
    ? `from north; the ridge runs ${compass(deg)} to ${compass(deg + 180)}`
    : "from north";
}

/** Whose, where, what and how large: enough to draw a house and find its weather. */
export function PinForm(props: PinFormProps) {
  const { draft, onDraft, problems, asksFar, busy } = props;
  const page = useRef<HTMLDivElement>(null);
  const problemKeys = Object.keys(problems).join(" ");
  useEffect(() => {
    if (problemKeys === "") return;
    const first = page.current?.querySelector<HTMLElement>('[aria-invalid="true"], [data-problem]');
    first?.scrollIntoView?.({ block: "center" });
    first?.focus({ preventScroll: true });
  }, [problemKeys]);
  const set = (change: Partial<PinDraft>) => onDraft({ ...draft, ...change });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    props.onSave(false);
  };
  const positionProblem =
    problems["position.latitudeDeg"] ?? problems["position.longitudeDeg"] ?? problems.position;
  return (
    <div ref={page} className="min-h-0 flex-1 overflow-y-auto">
      <div className="border-b border-rule-strong px-5 py-4">
        <h1 className="m-0 font-sign text-xl font-extrabold">Pin a building</h1>
      </div>
      <Part title="Whose it is">
        <FarmChoice
          farms={props.farms}
          value={draft.farmId}
          onChange={props.onFarm}
          cooperativeId={props.cooperativeId}
          problem={problems.farmId}
        />
      </Part>
      <form onSubmit={submit} noValidate aria-label="The building">
        <Part title="Where it stands">
          <PlaceSearch
            label="Look at a town"
            hint="Moves the map. The pin stays where it is."
            onPick={props.onLook}
          />
          <PositionFields
            position={draft.position}
            onPosition={(position) => set({ position })}
            problem={positionProblem}
          />
          {asksFar ? (
            <Button kind="quiet" busy={busy} onClick={() => props.onSave(true)}>
              The place is right, keep it
            </Button>
          ) : null}
          <StationCard position={draft.position} />
        </Part>
        <Part title="What it is">
          <TextField
            label="Name"
            hint="As people on the farm call it."
            value={draft.name}
            onValue={(name) => set({ name })}
            problem={problems.name}
            autoComplete="off"
          />
          <Segmented
            label="Kind"
            quietLabel={false}
            options={kinds}
            value={draft.kind}
            onChange={(kind) => onDraft(withKind(draft, kind))}
          />
          <ShapeChoice
            kind={draft.kind}
            value={draft.shapeType}
            onChange={(shapeType) => set({ shapeType })}
            problem={problems.shapeType}
          />
        </Part>
        <Part title="Ground plan">
          <PinQuantity
            label="Length"
            hint="along the ridge"
            value={draft.length}
            onChange={(length) => set({ length })}
            problem={problems["footprint.length"]}
          />
          <PinQuantity
            label="Width"
            hint="over all spans"
            value={draft.width}
            onChange={(width) => set({ width })}
            problem={problems["footprint.width"]}
          />
          <PinQuantity
            label="Ridge bearing"
            hint={bearingHint(draft)}
            value={draft.ridgeBearing}
            onChange={(ridgeBearing) => set({ ridgeBearing })}
            problem={problems["footprint.ridgeBearing"]}
          />
        </Part>
        <div className="sticky bottom-0 flex flex-wrap items-center gap-3 border-t-2 border-ink bg-limewash px-5 py-3">
          {props.refusal ? (
            <p role="alert" className="m-0 w-full border-l-[6px] border-redlead bg-redlead-tint p-3 text-sm">
              {props.refusal}
            </p>
          ) : null}
          <Button type="submit" busy={busy}>
            Keep it and survey
          </Button>
          <Link to={props.backTo} className={buttonLook("plain")}>
            Leave it
          </Link>
        </div>
      </form>
    </div>
  );
}
