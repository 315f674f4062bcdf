import type { GainPath, LossPath, MonthEnergy } from "../plan/plan-types.ts";
import type { RoomHourResult } from "./day-run.ts";
import type { SplitRoomHour } from "./room-hours.ts";

/** A room less than this below its set-point still counts as held, K. Source [THERMOSTAT]. */
const HELD_WITHIN_K = 0.5;
/** A heater that gives less is off, W. */
const HEATING_ABOVE_W = 1;

/** Adds typical days up to a month. */
export class EnergySum {
  private readonly losses: Record<LossPath, number> = { cover: 0, sky: 0, air: 0, ground: 0 };
  private readonly gains: Record<GainPath, number> = { sun: 0, stock: 0, lights: 0 };
  private readonly heaterByHour = Array<number>(24).fill(0);
  private readonly outdoorByHour = Array<number>(24).fill(0);
  private heater = 0;
  private vented = 0;
  private unmet = 0;
  private heatingHours = 0;
  private belowHours = 0;
  private wetHours = 0;
  private readonly insideDewPointC: number;

  constructor(insideDewPointC: number) {
    this.insideDewPointC = insideDewPointC;
  }

  addDay(hours: readonly SplitRoomHour[], results: readonly RoomHourResult[], days: number): void {
    hours.forEach((hour, index) => {
      const result = results[index];
      if (result) this.addHour(hour, result, index, days);
    });
  }

  private addHour(hour: SplitRoomHour, result: RoomHourResult, index: number, days: number): void {
    const insideC = result.insideTempC;
    const lossW = hour.lossAtReferenceW + hour.lossPerInsideWK * (insideC - hour.referenceC);
    // Heat that comes in through a warm shell and leaves with the air again is neither loss nor gain.
    const passingW = lossW < 0 ? Math.min(result.ventedW, -lossW) : 0;
    const counted = lossW < 0 ? days * (1 + passingW / lossW) : days;
    const airW = hour.airWK * (insideC - hour.outdoorTempC);
    const groundW = hour.groundWK * (insideC - hour.outdoorTempC);
    this.losses.air += airW * counted;
    this.losses.ground += groundW * counted;
    this.losses.sky += hour.skyW * counted;
    this.losses.cover += (lossW - airW - groundW - hour.skyW) * counted;
    this.gains.sun += hour.gainsW.sun * days;
    this.gains.stock += hour.gainsW.stock * days;
    this.gains.lights += hour.gainsW.lights * days;
    this.vented += (result.ventedW - passingW) * days;
    this.heater += result.heaterW * days;
    this.unmet += (result.neededW - result.heaterW) * days;
    this.heaterByHour[index] = (this.heaterByHour[index] ?? 0) + result.heaterW * days;
    this.outdoorByHour[index] = (this.outdoorByHour[index] ?? 0) + hour.outdoorTempC * days;
    if (result.heaterW > HEATING_ABOVE_W) this.heatingHours += days;
    if (result.insideTempC < hour.setpointC - HELD_WITHIN_K) this.belowHours += days;
    if (hour.innerFaceC < this.insideDewPointC) this.wetHours += days;
  }

  result(days: number): MonthEnergy {
    const kwh = (wattHours: number) => wattHours / 1000;
    const gainsTotal = this.gains.sun + this.gains.stock + this.gains.lights;
    const used = gainsTotal > 0 ? Math.max(0, 1 - this.vented / gainsTotal) : 0;
    return {
      heaterKwh: kwh(this.heater),
      lossesKwh: {
        cover: kwh(this.losses.cover),
        sky: kwh(this.losses.sky),
        air: kwh(this.losses.air),
        ground: kwh(this.losses.ground),
      },
      gainsKwh: {
        sun: kwh(this.gains.sun * used),
        stock: kwh(this.gains.stock * used),
        lights: kwh(this.gains.lights * used),
      },
      ventedSurplusKwh: kwh(this.vented),
      unmetKwh: kwh(this.unmet),
      heatingHours: this.heatingHours,
      hoursBelowSetpoint: this.belowHours,
      wetCoverHours: this.wetHours,
      heaterByHourW: this.heaterByHour.map((sum) => sum / days),
      outdoorByHourC: this.outdoorByHour.map((sum) => sum / days),
    };
  }
}
