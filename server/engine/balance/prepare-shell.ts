import type { OutsideModel } from "../envelope/convection.ts";
import { wetInside } from "../envelope/wet-cover.ts";
import { EngineInputError } from "../errors.ts";
import type { HouseGeometry, Surface } from "../geometry/house-geometry.ts";
import type { Assembly, HousePart, HousePlanInput } from "../plan/house-input.ts";
import { type AtticPart, ceilingFlux } from "./attic.ts";
import type { HouseShell } from "./house-losses.ts";
import { screenLeakageM3HM2 } from "./screen-air.ts";
import { ceilingUValueWM2K } from "./stack-resistance.ts";
import { prepareStackFlux } from "./stack-surface.ts";
import type { FluxGroup, SurfaceModel } from "./surface-model.ts";
import { screenedUValueWM2K, type TypedRule, typedFlux } from "./typed-surface.ts";
import { outsideView } from "./view.ts";

export type ShellInput = Pick<
  HousePlanInput,
  "kind" | "covers" | "screen" | "crop" | "shape" | "floorEdgeLossWMK" | "frameAndDirtFrac"
>;

interface ShellContext {
  input: ShellInput;
  geometry: HouseGeometry;
  pressurePa: number;
  typedRule: TypedRule;
  outsideModel: OutsideModel;
  wetInside: boolean;
}

/** Ranges from this floor area on are ruled by the flow over many ridges, m². Source [BOTRULE]. */
const LARGE_RANGE_M2 = 10_000;

/**
 * Makes a house ready for many hours: every surface with its cover, view and screen; surfaces that are alike share one group.
 * Shape: covers and screen, geometry, air pressure Pa, how typed U-values are used → shell.
 * Throws EngineInputError where a part has no cover. Source [ISO6946], [WALTON1983], [SCREENTABLE].
 */
export function prepareShell(
  input: ShellInput,
  geometry: HouseGeometry,
  pressurePa: number,
  typedRule: TypedRule,
): HouseShell {
  const context: ShellContext = {
    input,
    geometry,
    pressurePa,
    typedRule,
    outsideModel: outsideModelFor(input, geometry),
    wetInside: coverIsWet(input),
  };
  const groups: FluxGroup[] = [];
  const indexByKey = new Map<string, number>();
  const surfaces = geometry.surfaces
    .filter((surface) => surface.zone === "house")
    .map((surface): SurfaceModel => {
      const assembly = assemblyFor(input, surface);
      const key = `${partOf(surface)}|${surface.skyViewFrac.toFixed(4)}`;
      const known = indexByKey.get(key);
      const group = known ?? groups.push(makeGroup(context, surface, assembly, key)) - 1;
      indexByKey.set(key, group);
      const entry = groups[group];
      if (entry) entry.areaM2 += surface.areaM2;
      const screened = input.screen !== null && surface.role === "roof";
      return {
        id: surface.id,
        label: surface.label,
        role: surface.role,
        areaM2: surface.areaM2,
        tiltDeg: surface.tiltDeg,
        azimuthDeg: surface.azimuthDeg,
        view: outsideView(surface.skyViewFrac),
        assemblyName: assembly.name,
        group,
        solarTransmittance: assembly.solarTransmittance * input.frameAndDirtFrac,
        screenSolarShare:
          screened && input.screen
            ? 1 - input.screen.coverageFrac * (1 - input.screen.solarTransmittance)
            : 1,
      };
    });
  return {
    surfaces,
    groups,
    perimeterM: geometry.perimeterM,
    floorEdgeLossWMK: input.floorEdgeLossWMK,
    pressurePa,
  };
}

/** Free-standing houses, large ranges and barns have each their own law of outside convection. Source [BOTRULE]. */
function outsideModelFor(input: ShellInput, geometry: HouseGeometry): OutsideModel {
  if (input.kind === "barn") return "iso6946";
  const range = input.shape.type === "venlo" || input.shape.type === "multiSpan";
  return range && geometry.floorAreaM2 >= LARGE_RANGE_M2 ? "bot" : "watmuff";
}

/** From this humidity on the covers of a cropped house are taken as wet inside. Source [WETRULE]. */
const WET_FROM_HUMIDITY = 0.6;

/** Whether the inner face of the covers carries water on a design night. Shape: house → boolean. Source [WETRULE]. */
export function coverIsWet(input: Pick<ShellInput, "kind" | "crop">): boolean {
  return input.kind === "greenhouse" && input.crop !== null && input.crop.humidityFrac >= WET_FROM_HUMIDITY;
}

function partOf(surface: Surface): HousePart {
  return surface.role;
}

function assemblyFor(input: ShellInput, surface: Surface): Assembly {
  const own = input.covers[partOf(surface)];
  if (own) return own;
  if (surface.role === "kneewall") return input.covers.sideWall;
  throw new EngineInputError({
    quantity: `covers.${surface.role}`,
    value: Number.NaN,
    reason: "inconsistent",
    note: `Nothing says what the ${surface.role} is made of.`,
  });
}

function makeGroup(context: ShellContext, surface: Surface, assembly: Assembly, key: string): FluxGroup {
  if (surface.role === "ceiling") return ceilingGroup(context, surface, assembly, key);
  const screen = surface.role === "roof" ? context.input.screen : null;
  const { geometry, typedRule } = context;
  const view = outsideView(surface.skyViewFrac);
  if (assembly.kind === "uValue") {
    const shutUWM2K = screen
      ? screenedUValueWM2K(assembly.uValueWM2K, screen.savingFrac, screen.coverageFrac)
      : assembly.uValueWM2K;
    return {
      key,
      areaM2: 0,
      layerNames: [assembly.name],
      flux: (insideTempC, outside, position) =>
        typedFlux(
          position === "shut" ? shutUWM2K : assembly.uValueWM2K,
          insideTempC,
          outside,
          view.skyFrac,
          typedRule,
        ),
    };
  }
  return {
    key,
    areaM2: 0,
    layerNames: assembly.stack.layers.map((layer) => layer.name),
    flux: prepareStackFlux({
      stack: context.wetInside ? wetInside(assembly.stack) : assembly.stack,
      view,
      tiltDeg: surface.tiltDeg,
      outsideModel: context.outsideModel,
      screen,
      screenLeakageM3HM2: screen ? screenLeakageM3HM2(screen, geometry.lengthM, geometry.floorAreaM2) : 0,
    }),
  };
}

function ceilingGroup(context: ShellContext, surface: Surface, assembly: Assembly, key: string): FluxGroup {
  const { geometry, pressurePa } = context;
  const parts = geometry.surfaces
    .filter((part) => part.zone === "attic")
    .map((part): AtticPart => {
      const made = makeGroup(context, part, assemblyFor(context.input, part), part.id);
      return {
        areaM2: part.areaM2,
        flux: (atticTempC, outside, sunWM2) => made.flux(atticTempC, outside, "open", sunWM2),
      };
    });
  const attic = {
    ceilingAreaM2: surface.areaM2,
    ceilingUValueWM2K: assembly.kind === "uValue" ? assembly.uValueWM2K : ceilingUValueWM2K(assembly.stack),
    volumeM3: geometry.atticVolumeM3,
    pressurePa,
    parts,
  };
  return {
    key,
    areaM2: 0,
    layerNames: [assembly.name],
    flux: (insideTempC, outside, _screen, sunWM2) => ceilingFlux(attic, insideTempC, outside, sunWM2),
  };
}
