import type { GainsW, HouseBalance, HouseStateId, SurfaceFlow } from "../plan/plan-types.ts";
import {
  type AirFlows,
  type HouseLosses,
  type HouseShell,
  houseLosses,
  type ShellHour,
} from "./house-losses.ts";
import { settlesAtC } from "./settle.ts";
import type { OutsideHour, ScreenPosition } from "./surface-model.ts";
import { holdVerdict } from "./verdict.ts";

/** A steady hour of a house: its state, the weather, what is inside and how much heat is fitted. */
export interface BalanceHour {
  month: number;
  state: HouseStateId;
  outside: OutsideHour;
  soilTempC: number;
  screen: ScreenPosition;
  air: AirFlows;
  /** Which rule set the air flow. */
  airGoverns: string;
  setpointC: number;
  criticalTempC: number;
  occupied: boolean;
  insideHumidityFrac: number;
  /** Dew point of the inside air, °C. */
  insideDewPointC: number;
  /** Sun that warms the room and mean sun on each group of surfaces, W and W/m². */
  sunGainW: number;
  groupSunWM2: readonly number[];
  lightsW: number;
  /** Sensible heat of the stock at an inside temperature. */
  stockSensibleW(insideTempC: number): number;
  installedHeatW: number;
}

/**
 * The house at one steady hour: every path in W, the heat that is needed, and where the house settles with the heat it has.
 * Losses less gains equal the needed heat; what the gains exceed the losses by is carried out by air and counted there.
 * Shape: shell, hour → balance. Set-point −30 to 50 °C. Closes to 1e-9 of the losses. Source [ASHRAEAPP], [AIRHEAT].
 */
export function houseBalance(shell: HouseShell, hour: BalanceHour): HouseBalance {
  const { outside, setpointC } = hour;
  const shellHour: ShellHour = {
    outside,
    screen: hour.screen,
    air: hour.air,
    groupSunWM2: hour.groupSunWM2,
  };
  const losses = houseLosses(shell, shellHour, setpointC);
  const gainsW: GainsW = {
    sun: hour.sunGainW,
    stock: hour.stockSensibleW(setpointC),
    lights: hour.lightsW,
  };
  const netW = losses.totalW - gainsW.sun - gainsW.stock - gainsW.lights;
  const surplusW = Math.max(0, -netW);
  const settles = settledC(shell, hour, shellHour, netW);
  return {
    month: hour.month,
    state: hour.state,
    outdoorTempC: outside.airTempC,
    skyTempC: outside.skyTempC,
    soilTempC: hour.soilTempC,
    windMS: outside.windMS,
    insideTempC: setpointC,
    insideHumidityFrac: hour.insideHumidityFrac,
    lossesW: { ...losses.lossesW, air: losses.lossesW.air + surplusW },
    gainsW,
    requiredHeatW: Math.max(0, netW),
    surplusW,
    surfaces: surfaceFlows(shell, losses, hour),
    ventilationM3H: hour.air.fansM3H + hour.air.leaksM3H,
    ventilationGoverns: hour.airGoverns,
    settlesAtC: settles,
    installedHeatW: hour.installedHeatW,
    verdict: hour.occupied ? holdVerdict(settles, setpointC, hour.criticalTempC) : "notApplicable",
  };
}

function settledC(shell: HouseShell, hour: BalanceHour, shellHour: ShellHour, netW: number): number {
  const { setpointC, installedHeatW } = hour;
  const shortageW = (insideC: number) =>
    houseLosses(shell, shellHour, insideC).totalW -
    hour.sunGainW -
    hour.lightsW -
    hour.stockSensibleW(insideC) -
    installedHeatW;
  const outdoorC = hour.outside.airTempC;
  // In proportion: the house cools until its need has shrunk to the heat it has.
  const guessC = outdoorC + (setpointC - outdoorC) * (installedHeatW / Math.max(netW, 1));
  return settlesAtC(shortageW, netW - installedHeatW, setpointC, outdoorC, guessC);
}

/**
 * The same hour with other heat fitted: nothing but where the house settles changes.
 * Shape: shell, hour, its balance, heat W → balance. Source [DOWELL1971].
 */
export function withOtherHeat(
  shell: HouseShell,
  hour: BalanceHour,
  balance: HouseBalance,
  state: HouseStateId,
  installedHeatW: number,
): HouseBalance {
  const changed = { ...hour, installedHeatW };
  const shellHour = {
    outside: hour.outside,
    screen: hour.screen,
    air: hour.air,
    groupSunWM2: hour.groupSunWM2,
  };
  const settles = settledC(shell, changed, shellHour, balance.requiredHeatW - balance.surplusW);
  return {
    ...balance,
    state,
    installedHeatW,
    settlesAtC: settles,
    verdict: hour.occupied ? holdVerdict(settles, hour.setpointC, hour.criticalTempC) : "notApplicable",
  };
}

/** Below this difference a U-value worked out from the flow has no meaning, K. */
const SMALLEST_DIFFERENCE_K = 0.5;

function surfaceFlows(shell: HouseShell, losses: HouseLosses, hour: BalanceHour): SurfaceFlow[] {
  const differenceK = hour.setpointC - hour.outside.airTempC;
  return shell.surfaces.map((surface) => {
    const flux = losses.fluxes[surface.group];
    const lossWM2 = flux?.lossWM2 ?? 0;
    const toSkyWM2 = flux?.toSkyWM2 ?? 0;
    const faceTempsC = flux?.faceTempsC ?? [];
    return {
      surfaceId: surface.id,
      label: surface.label,
      role: surface.role,
      areaM2: surface.areaM2,
      assemblyName: surface.assemblyName,
      uValueWM2K: Math.abs(differenceK) >= SMALLEST_DIFFERENCE_K ? lossWM2 / differenceK : 0,
      lossW: lossWM2 * surface.areaM2,
      toAirW: (lossWM2 - toSkyWM2) * surface.areaM2,
      toSkyW: toSkyWM2 * surface.areaM2,
      faceTempsC,
      layerNames: shell.groups[surface.group]?.layerNames ?? [],
      wetInside: (faceTempsC[0] ?? hour.setpointC) < hour.insideDewPointC,
    };
  });
}
