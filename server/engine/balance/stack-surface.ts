import { type OutsideModel, outsideConvectionWM2K } from "../envelope/convection.ts";
import { type CoverBalance, type CoverSolver, prepareCoverSolver } from "../envelope/cover-balance.ts";
import type { CoverStack } from "../envelope/cover-types.ts";
import type { ScreenInput } from "../plan/house-input.ts";
import type { FluxGroup, OutsideHour, SurfaceFlux } from "./surface-model.ts";
import type { OutsideView } from "./view.ts";

export interface StackSurface {
  stack: CoverStack;
  view: OutsideView;
  tiltDeg: number;
  outsideModel: OutsideModel;
  screen: ScreenInput | null;
  screenLeakageM3HM2: number;
}

/** Space between a closed screen and the roof, m: wide enough that only stirring counts. */
const SCREEN_SPACE_M = 0.3;
/** Emissivity of snow. Source [SNOWRULE], from memory 0.82 to 0.99. */
const SNOW_EMISSIVITY = 0.95;
/** Snow slides off anything steeper, degrees. Source [SNOWRULE]. */
const SNOW_SLIDES_DEG = 60;

/**
 * Makes the flux of a layered cover: one solver each for the open cover, the closed screen and snow on top, all started from
 * where they last stood. A screen that covers a part is weighed by that part.
 * Snow counts as a black outer face and not as insulation, because a heated roof must keep melting it.
 * Shape: layers, view, tilt, screen → function of inside °C, hour, screen position and sun. Source [NETWORK] through the cover solver, [SNOWRULE].
 */
export function prepareStackFlux(surface: StackSurface): FluxGroup["flux"] {
  const snowLies = surface.tiltDeg < SNOW_SLIDES_DEG;
  const open = warmStarted(surface, surface.stack);
  const openSnow = snowLies ? warmStarted(surface, underSnow(surface.stack)) : open;
  const { screen } = surface;
  if (screen === null)
    return (insideTempC, outside, _position, sunWM2) =>
      (outside.snow ? openSnow : open)(insideTempC, outside, sunWM2);
  const screened = withScreen(surface.stack, screen, surface.screenLeakageM3HM2);
  const shut = warmStarted(surface, screened);
  const shutSnow = snowLies ? warmStarted(surface, underSnow(screened)) : shut;
  return (insideTempC, outside, position, sunWM2) => {
    const bare = outside.snow ? openSnow : open;
    if (position === "open") return bare(insideTempC, outside, sunWM2);
    const covered = (outside.snow ? shutSnow : shut)(insideTempC, outside, sunWM2);
    const share = screen.coverageFrac;
    if (share >= 1) return covered;
    const uncovered = bare(insideTempC, outside, sunWM2);
    return {
      lossWM2: share * covered.lossWM2 + (1 - share) * uncovered.lossWM2,
      toSkyWM2: share * covered.toSkyWM2 + (1 - share) * uncovered.toSkyWM2,
      faceTempsC: covered.faceTempsC,
    };
  };
}

type PlainFlux = (insideTempC: number, outside: OutsideHour, sunWM2: number) => SurfaceFlux;

/**
 * Loss of one cover, and how much of it the cold sky brings about: the loss less what it would be under a sky as warm as the air.
 * So told, no part is negative while a skin is colder than the air, and insulation is not hidden behind the skin's own exchange.
 */
function warmStarted(surface: StackSurface, stack: CoverStack): PlainFlux {
  const underSky = rememberingSolver(surface, stack);
  const underAir = rememberingSolver(surface, stack);
  return (insideTempC, outside, sunWM2) => {
    const { fromRoomWM2, faceTempsC } = underSky(insideTempC, outside, outside.skyTempC, sunWM2);
    return {
      lossWM2: fromRoomWM2,
      // Worked out when it is read: searches for a balance ask for the loss alone, many times.
      get toSkyWM2() {
        return fromRoomWM2 - underAir(insideTempC, outside, outside.airTempC, sunWM2).fromRoomWM2;
      },
      faceTempsC,
    };
  };
}

/** A solver that starts from where it last stood. */
function rememberingSolver(surface: StackSurface, stack: CoverStack) {
  let solver: CoverSolver | undefined;
  let lastFacesC: number[] | undefined;
  const absorptances = stack.layers.map((layer) =>
    Math.max(0, 1 - layer.solarTransmittance - layer.solarReflectance),
  );
  return (insideTempC: number, outside: OutsideHour, skyC: number, sunWM2: number): CoverBalance => {
    solver ??= prepareCoverSolver(stack);
    const balance = solver.solve(
      {
        insideAirC: insideTempC,
        insideRadiantC: insideTempC,
        outsideAirC: outside.airTempC,
        skyC,
        groundC: outside.airTempC,
        skyViewFrac: surface.view.skyFrac,
        tiltDeg: surface.tiltDeg,
        outsideCoefficientWM2K: outsideConvectionWM2K(outside.windMS, surface.outsideModel),
        absorbedSolarWM2: sunWM2 > 0 ? absorbedByLayer(stack, absorptances, sunWM2) : undefined,
      },
      lastFacesC,
    );
    lastFacesC = balance.faceTempsC;
    return balance;
  };
}

/** Sun taken up by each layer on its way in, the outermost first to meet it; reflections between layers are left out. */
function absorbedByLayer(stack: CoverStack, absorptances: readonly number[], sunWM2: number): number[] {
  const absorbed = Array<number>(stack.layers.length).fill(0);
  let arrivingWM2 = sunWM2;
  for (let index = stack.layers.length - 1; index >= 0; index--) {
    absorbed[index] = arrivingWM2 * (absorptances[index] ?? 0);
    arrivingWM2 *= stack.layers[index]?.solarTransmittance ?? 0;
  }
  return absorbed;
}

function withScreen(stack: CoverStack, screen: ScreenInput, leakageM3HM2: number): CoverStack {
  return {
    layers: [
      {
        name: screen.name,
        resistanceM2KW: 0,
        solarTransmittance: screen.solarTransmittance,
        solarReflectance: Math.max(0, 0.95 - screen.solarTransmittance),
        emissivityIn: screen.emissivityIn,
        emissivityOut: screen.emissivityOut,
        longwaveTransmittance: screen.longwaveTransmittance,
      },
      ...stack.layers,
    ],
    gaps: [
      { kind: "still", thicknessM: SCREEN_SPACE_M, coefficientWM2K: 0, airLeakageM3HM2: leakageM3HM2 },
      ...stack.gaps,
    ],
  };
}

function underSnow(stack: CoverStack): CoverStack {
  const last = stack.layers.length - 1;
  return {
    ...stack,
    layers: stack.layers.map((layer, index) =>
      index === last
        ? {
            ...layer,
            emissivityOut: SNOW_EMISSIVITY,
            longwaveTransmittance: 0,
            solarTransmittance: 0,
            solarReflectance: 0.8,
          }
        : layer,
    ),
  };
}
