/**
 * The whole public surface of the heat engine, by topic.
 * Everything here is a pure function of its arguments: no files, no network, no clock, no chance.
 */

export {
  SOLAR_CONSTANT_WM2,
  STANDARD_PRESSURE_PA,
  STEFAN_BOLTZMANN_WM2K4,
  ZERO_CELSIUS_K,
} from "./constants.ts";
export type { InputErrorDetail, InputErrorReason } from "./errors.ts";
export { EngineInputError, requireInRange } from "./errors.ts";
// -- basics
export { ENGINE_VERSION } from "./version.ts";

// -- air

export type { DampRoom, DryLimit } from "./air/condensation.ts";
// Inner faces: their temperature, least insulation that stays dry, highest humidity.
export { dryHumidityFrac, dryLimit, insideFaceTempC } from "./air/condensation.ts";
// Moist air: water, volume, heat, dew point, pressure with height.
export {
  airDensityKgM3,
  airHeatCapacityWhM3K,
  dewPointC,
  enthalpyKjKg,
  evaporationHeatKjKg,
  exhaustEnthalpyW,
  humidityRatio,
  humidityRatioFromDewPoint,
  humidityRatioFromPressure,
  pressureAtAltitudePa,
  relativeHumidityFrac,
  specificVolumeM3Kg,
  sublimationHeatKjKg,
  vapourPressureFromRatioPa,
  vapourPressurePa,
} from "./air/moist-air.ts";
// Saturation over ice and water, and its inverse.
export { dewPointFromPressureC, saturationPressurePa } from "./air/saturation.ts";
// Heat to warm the air that replaces exhaust.
export { exhaustHeatWhM3K } from "./air/ventilation-air.ts";
// Wetted thermometer.
export { wetBulbC } from "./air/wet-bulb.ts";

// -- sun

// Length of the beam's path through the air.
export { absoluteAirMass, relativeAirMass } from "./solar/air-mass.ts";
// Clear-sky sun by two models.
export { haurwitzWM2, ineichenPerez } from "./solar/clear-sky.ts";
// Diffuse share of the sun, hours of a day.
export {
  diffuseHourShareOfDay,
  diffuseShareErbs,
  diffuseShareMonthly,
  diffuseShareOrgillHollands,
  hourShareOfDay,
} from "./solar/decomposition.ts";
// Declination, equation of time, distance, sunset, sun outside the air.
export {
  dailyExtraterrestrialKwhM2,
  declinationDeg,
  distanceFactor,
  equationOfTimeMin,
  sunsetHourAngleDeg,
} from "./solar/extraterrestrial.ts";
// Angle of the beam on a plane.
export { incidenceCosine } from "./solar/incidence.ts";
// Diffuse sky with rings around sun and horizon.
export { perezDiffuse } from "./solar/perez.ts";
export type { SunHour } from "./solar/representative-day.ts";
// A month's mean day in 24 hours.
export { representativeDaySun } from "./solar/representative-day.ts";
export type { SunPosition } from "./solar/sun-position.ts";
// Where the sun stands.
export { representativeDayOfYear, solarMidnightMs, sunPosition } from "./solar/sun-position.ts";
export type { DiffuseModel, FlatIrradiance, PlaneIrradiance } from "./solar/transposition.ts";
// Sun on any plane by five models.
export { diffuseModels, planeIrradiance } from "./solar/transposition.ts";

// -- geometry

export type { GeoPoint } from "./geometry/footprint.ts";
// Corners of a ground plan on the globe.
export { footprintCorners } from "./geometry/footprint.ts";
export type { HouseGeometry, Surface, SurfaceRole } from "./geometry/house-geometry.ts";
// Surfaces, areas and volume of a house.
export { houseGeometry } from "./geometry/house-geometry.ts";
export type { HouseShape } from "./geometry/house-shape.ts";
export type { SectionPoint } from "./geometry/section.ts";
// Across-section for drawing.
export { archHalfAngle, sectionOutline, spanSection } from "./geometry/section.ts";

// -- envelope

// Resistance of closed air layers.
export { airLayerM2KW } from "./envelope/air-layer.ts";
// Walls with studs and other bridges.
export { bridgedConduction } from "./envelope/bridged-conduction.ts";
export type { OutsideModel } from "./envelope/convection.ts";
// Convection outside, inside and in air layers.
export {
  airLayerConvectionWM2K,
  insideConvectionWM2K,
  outsideConvectionWM2K,
  outsideModels,
} from "./envelope/convection.ts";
export type { CoverBalance, CoverBoundary, CoverSolver } from "./envelope/cover-balance.ts";
// Heat balance of a cover of several layers.
export { FLOOR_EMISSIVITY, prepareCoverSolver, solveCoverBalance } from "./envelope/cover-balance.ts";
export type { CoverGap, CoverLayer, CoverStack } from "./envelope/cover-types.ts";
export type { ConductionLayer, ConductionResult } from "./envelope/layered-conduction.ts";
// One flow through layers in series.
export { layeredConduction, layerResistanceM2KW } from "./envelope/layered-conduction.ts";
// Fourth-power law: bodies, plates, sunlit bodies.
export { blackBodyWM2, parallelPlatesWM2, radiativeBalanceTempC } from "./envelope/longwave.ts";
// How radiation is shared out in a stack.
export { longwaveExchange } from "./envelope/longwave-exchange.ts";
// Whole-cover U-value at stated reference conditions.
export { REFERENCE_CONDITIONS, referenceUValueWM2K } from "./envelope/reference-u-value.ts";
export type { SkyModel } from "./envelope/sky.ts";
// Sky emissivity and temperature by eight models, cloud, view factors.
export {
  cloudFromClearnessFrac,
  cloudySkyEmissivity,
  skyEmissivity,
  skyModels,
  skyTemperatureC,
  skyTempFromEmissivityC,
  viewFactors,
} from "./envelope/sky.ts";
export type { HeatFlowDirection } from "./envelope/surface-resistance.ts";
// Surface resistances by formula and by convention.
export {
  blackRadiativeWM2K,
  conventionalSurfaceM2KW,
  insideSurfaceM2KW,
  outsideSurfaceM2KW,
} from "./envelope/surface-resistance.ts";
// A cover with water on its inner face.
export { wetInside } from "./envelope/wet-cover.ts";

// -- livestock

export type { ActivityPattern } from "./livestock/activity.ts";
// Heat through the day by class, and of hens by their lamps.
export { activityPattern, hourlyActivity, lampActivityRatio } from "./livestock/activity.ts";
export type { AnimalClass, AnimalState, ClassTrust, SplitGroup } from "./livestock/animal-classes.ts";
// Total heat of an animal by class.
export {
  animalClasses,
  classTrust,
  growingPigClass,
  massRangeKg,
  splitGroup,
  totalHeatAt20W,
} from "./livestock/animal-classes.ts";
export type { StockHeat, StockHeatInput } from "./livestock/animal-heat.ts";
// Heat, water and carbon dioxide of a herd or flock.
export { animalHeat, CARBON_DIOXIDE_M3H_PER_KW } from "./livestock/animal-heat.ts";
export type { BarnHeat, BarnHeatInput, TemperatureSpan } from "./livestock/barn-heat.ts";
// A stocked barn on one night, and hours colder than a temperature.
export { barnHeat, hoursBelow } from "./livestock/barn-heat.ts";
export type { Bed } from "./livestock/critical-temperature.ts";
// Temperatures below which animals burn feed to keep warm.
export {
  calfLowerCriticalC,
  lowerCriticalTempC,
  pigCriticalTempC,
  pigLowerCriticalC,
  SETPOINT_ABOVE_CRITICAL_K,
  setpointTooCold,
} from "./livestock/critical-temperature.ts";
export type { FanPlan, FanPlanStep, FanStage, FlowComparison } from "./livestock/fans.ts";
// Fans: timers, stages, least flow, measured against needed.
export { compareFlow, fanPlan, leastFlowM3H, timerFlowM3H, timerRunS } from "./livestock/fans.ts";
export type { HeadRateRule } from "./livestock/head-rate.ts";
// Published winter rates for each animal.
export { broilerMetabolicM3H, headRateM3H } from "./livestock/head-rate.ts";
export type { ExchangerInput, ExchangerResult } from "./livestock/heat-recovery.ts";
// Air-to-air exchangers with their frost limit.
export { exchanger, frostLimitC } from "./livestock/heat-recovery.ts";
export type { CarbonDioxideSource, HeatRule } from "./livestock/heat-rules.ts";
// Three published rules for the split, and carbon dioxide by what is counted.
export {
  carbonDioxideRates,
  heatRules,
  sensibleShare1984,
  totalFactor1984,
  unitHeatBy,
} from "./livestock/heat-rules.ts";
export type { UnitHeat } from "./livestock/house-split.ts";
// Split into air and water, activity through the day.
export { activityRatio, unitHeat } from "./livestock/house-split.ts";
export type { LeakRule, Tightness } from "./livestock/leaks.ts";
// Leaks under fans, at other pressures, by suction test.
export { airWithLeaksM3H, leakAtPressure, tightnessFromSuction } from "./livestock/leaks.ts";
export type {
  MinimumVentilation,
  MinimumVentilationInput,
  VentilationRule,
} from "./livestock/minimum-ventilation.ts";
// Least ventilation with the rule that governs, heat recovery, balance temperature.
export {
  balanceTempC,
  heatRecoveryFrac,
  minimumVentilation,
} from "./livestock/minimum-ventilation.ts";
export type { SchedulePoint } from "./livestock/schedule.ts";
// Set-points, rates and masses by day of the batch.
export { dayOfMass, massOnDayKg, scheduleValue } from "./livestock/schedule.ts";
export type { StockEntry, StockNow } from "./livestock/stock-entry.ts";
// Stock given as count, live mass or day of a batch.
export { stockNow } from "./livestock/stock-entry.ts";
export type { VentilationCost, VentilationCostInput } from "./livestock/ventilation-cost.ts";
// What each ventilation rule costs.
export { ventilationCosts } from "./livestock/ventilation-cost.ts";

// -- heaters

export type { CombustionYield, Hydrocarbon } from "./heaters/combustion.ts";
// Water and carbon dioxide of burning, net over gross heating value.
export { combustionYield, hydrocarbons } from "./heaters/combustion.ts";
export type { AltitudeRule, PlateRating } from "./heaters/delivered-output.ts";
// What a heater really gives.
export { altitudeFactor, deliveredOutputW, rowOutputW } from "./heaters/delivered-output.ts";
export type { EfficiencyBasis } from "./heaters/efficiency-basis.ts";
// Efficiency on the gross value.
export { grossEfficiencyFrac } from "./heaters/efficiency-basis.ts";
// Pipe rail and heated floors.
export { floorHeatWM2, pipeHeatWM, pipeWaterTempC, WARMEST_FLOOR_C } from "./heaters/emitters.ts";
export type { FlameLimits } from "./heaters/flame-lines.ts";
// Rules for a barn's air with what flames add.
export { flameLines } from "./heaters/flame-lines.ts";
export type { HeatPumpSource, HeatPumpSpan } from "./heaters/heat-pump.ts";
// Heat pumps: COP by lift, season, break-even with a fuel, output in the cold.
export {
  airSourceOutputFrac,
  breakEvenCop,
  flowTempsC,
  heatPumpCop,
  seasonalCop,
} from "./heaters/heat-pump.ts";
export type { HeaterCandidate } from "./heaters/heater-candidates.ts";
// Ways to fit a house.
export { heaterCandidates, withoutLargestW } from "./heaters/heater-candidates.ts";
export type { PreheatInput } from "./heaters/preheat.ts";
// Output that warms an empty house in time.
export { preheatOutputW } from "./heaters/preheat.ts";
export type { Proposal, ProposalInput, ProposalKind } from "./heaters/propose-heaters.ts";
// Proposals in the sizes of one family, with spare and one unit out.
export { proposeHeaters } from "./heaters/propose-heaters.ts";
export type { LoadSpan } from "./heaters/season-loads.ts";
// Loads of a season by their hours.
export { seasonLoads } from "./heaters/season-loads.ts";
// Sizes heaters are made in.
export { nextStepW, outputStepsW } from "./heaters/size-steps.ts";
export type { HeaterControl, LoadHours, StageUse, StagingResult } from "./heaters/staging.ts";
// Stages through a season, turndown, loss of short cycles.
export { cyclingLossFrac, leastOutputFrac, stageUse } from "./heaters/staging.ts";
export type { HeaterFamily, UnitSize } from "./heaters/unit-sizes.ts";
// Sizes by family in kW or kBtu/h.
export { equalUnits, heaterFamilies, smallestUnit, unitSizes } from "./heaters/unit-sizes.ts";
// Burners without a flue.
export { combustionProducts, unventedBurner } from "./heaters/unvented.ts";
export type { AirLine, UnventedHouse, UnventedHouseInput } from "./heaters/unvented-house.ts";
// A house heated without flues, the flames' own air fed back.
export { flameAirByGasM3HKw, flameAirByWaterM3HKw, unventedHouse } from "./heaters/unvented-house.ts";

// -- fuel

export type { FuelEmissions, WarmingSet } from "./fuel/emissions.ts";
// Carbon dioxide, fossil and biogenic apart.
export { fuelEmissions, grossFactorFromNet, warmingAr4, warmingAr5 } from "./fuel/emissions.ts";
export type { DeliveredKwh, GrossKwh, NetKwh } from "./fuel/energy-kinds.ts";
// Gross, net and delivered energy, kept apart by type.
export {
  deliveredFrom,
  deliveredKwh,
  grossFor,
  grossFromNet,
  grossKwh,
  netFromGross,
  netKwh,
} from "./fuel/energy-kinds.ts";
export type { FuelProperties } from "./fuel/fuel-properties.ts";
export type { EnergyCount, FuelUnit } from "./fuel/fuel-units.ts";
// Every unit the trade counts fuel in.
export { amountOf, energyOf, fuelUnits, kwhGrossPerUnit, unitsOf } from "./fuel/fuel-units.ts";
export type { Tariff } from "./fuel/tariff.ts";
// What fuel costs and what a saving is worth.
export { periodCost, savingValue } from "./fuel/tariff.ts";
// Volumes at standard conditions.
export { liquidExpansionPerK, litresAt15C, standardGasM3 } from "./fuel/volume-correction.ts";
export type { WoodValue } from "./fuel/wood.ts";
// Wood by its moisture.
export { wetBasisMoisture, woodFuel, woodValue } from "./fuel/wood.ts";

// -- money

export type { Abatement, AbatementInput } from "./money/abatement.ts";
// Cost of avoided carbon dioxide.
export { abatementCost } from "./money/abatement.ts";
// Annuities.
export { annuityFactor, capitalRecoveryFactor } from "./money/annuity.ts";
export type { Investment, InvestmentFigures } from "./money/investment.ts";
// Payback, present value, internal rate, with and without grant.
export {
  discountedPaybackYears,
  internalRate,
  investmentFigures,
  netPresentValue,
  simplePaybackYears,
  withAndWithoutGrant,
} from "./money/investment.ts";
export type { LifeCycle } from "./money/life-cycle.ts";
// Cost over the whole life.
export { lifeCycleCost } from "./money/life-cycle.ts";
export type { PriceKind, YearlyRate } from "./money/rates.ts";
// Rates in constant prices and with inflation, never mixed.
export { nominalRate, realRate, requireSamePrices, toReal } from "./money/rates.ts";

// -- bills

// Days by number, dates that exist.
export { dateOf, dayNumber, daysInMonth } from "./bills/calendar-day.ts";
export type { BaseSearch, DegreeDayFit, DegreeDayReading } from "./bills/degree-day-fit.ts";
// Use against degree-days, use of a normal year, best base, what bills can prove.
export {
  bestBaseTemp,
  enoughReadings,
  fitDegreeDays,
  leastProvableSavingFrac,
  normalisedUse,
} from "./bills/degree-day-fit.ts";
export type { FitFigures } from "./bills/fit-figures.ts";
// How well a model follows bills.
export { fitFigures, fitLimits, fitsBills, readingsOff } from "./bills/fit-figures.ts";
export type { FoundFault, FuelRecord, RecordFault } from "./bills/fuel-records.ts";
// Faults of a fuel record, line by line.
export { recordFaults } from "./bills/fuel-records.ts";
export type { CauseInput, CauseKind, LikelyCause, MeterUser } from "./bills/likely-causes.ts";
// Why bills and model differ, and what a shared meter leaves unexplained.
export { likelyCauses, unexplained } from "./bills/likely-causes.ts";
export type { UseSpan } from "./bills/settle-records.ts";
// Estimates, credits and duplicates settled into uses.
export { settleRecords } from "./bills/settle-records.ts";
export type { Delivery, TankLevel } from "./bills/tank-use.ts";
// Use from deliveries and tank levels, shared out by degree-days.
export { shareOut, useBetweenFills, useBetweenLevels } from "./bills/tank-use.ts";

// -- failure

export type { GasInput } from "./failure/air-decay.ts";
// A gas in a house with some air change.
export { endGasFrac, gasAfterHoursFrac, hoursToGas } from "./failure/air-decay.ts";
export type { CoolingInput } from "./failure/cooling.ts";
// Cooling of a house without heat, carbon dioxide without air.
export { endTempC, hoursToCarbonDioxide, hoursToTemp, tempAfterHoursC } from "./failure/cooling.ts";
export type { DangerLimits } from "./failure/danger.ts";
// What harms animals in still air, and where alarms belong.
export { alarmTempsC, dangerLimits } from "./failure/danger.ts";
export type { MassRange } from "./failure/house-mass.ts";
// Heat a house holds, with its range.
export { houseMass, massAround } from "./failure/house-mass.ts";
export type { OutageHouse, OutageMoment } from "./failure/outage.ts";
// Temperature, carbon dioxide and water after something stops.
export { hoursUntil, outageCourse, saturatedWaterKgM3 } from "./failure/outage.ts";
export type { StandbyLoad, StandbyNeed } from "./failure/standby.ts";
// What a standby generator must carry, and whether it comes in time.
export { connectsInTime, standbyNeed } from "./failure/standby.ts";
export type {
  HoursBand,
  OutageLimits,
  OutageResult,
  Threat,
  TwoNights,
  TwoNightsInput,
} from "./failure/two-nights.ts";
// Heater out with fans running, and everything off.
export { twoNights } from "./failure/two-nights.ts";

// -- climate

// Degree-days to any base by three methods, and the mean shortfall of a normally distributed temperature.
export {
  degreeDaysErbs,
  degreeDaysHitchin,
  degreeDaysNormal,
  meanShortfallK,
} from "./climate/degree-days.ts";
// Design temperatures: yearly percentiles, their spread over the months, one month on its own.
export {
  annualPercentileFromMonthsC,
  DAYS_IN_MONTH,
  monthlyDesignTempsC,
  monthPercentileTempC,
} from "./climate/design-temperature.ts";
// The coldest night once in N years.
export {
  onceInYearsTempC,
  returnPeriodFactor,
  TYPICAL_YEARLY_MIN_SPREAD_K,
  yearlyMinSpreadK,
} from "./climate/extremes.ts";
export type { FigureOrigin, FilledMonths } from "./climate/fill-missing.ts";
// Gaps of a station filled by stated rules, each with its origin.
export { fillMissingMonths } from "./climate/fill-missing.ts";
// Spread of hourly and daily temperatures from range and swing.
export { hourlySpreadK, typicalDailySpreadK } from "./climate/hourly-spread.ts";
export type { RankedStation, StationPlace } from "./climate/nearest-station.ts";
// Distance on the globe, and the nearest stations with height counted in.
export { greatCircleKm, nearestStations } from "./climate/nearest-station.ts";
// The normal distribution the climate methods stand on.
export { normalDensity, normalQuantile, normalShareBelow } from "./climate/normal-distribution.ts";
export type { RepresentativeDay } from "./climate/representative-days.ts";
// Typical days that keep a month's mean, spread and daily range.
export { diurnalDeviationsK, equalShareClasses, representativeDays } from "./climate/representative-days.ts";
export type { SiteClimate, YearlyDesign } from "./climate/site-climate.ts";
// A station's normals brought to a site, with both design temperatures of every month.
export { siteClimate, yearlyEverydayDesign, yearlyExtremeDesign } from "./climate/site-climate.ts";
export type { Shelter, SiteCorrection } from "./climate/site-correction.ts";
// Correction for height and frost hollow with reasons, wind at the eave.
export { LAPSE_RATE_KM, siteCorrection, windAtEaveMS } from "./climate/site-correction.ts";
export type { ClimateFlag, StationClimate } from "./climate/station-climate.ts";

// -- house balance, months, sizing, plan

// Heat carried by air, by height.
export { AIR_HEAT_WHM3K, airHeatWK } from "./balance/air-heat.ts";
export type { AtticPart, AtticSpace } from "./balance/attic.ts";
// A ceiling under a cold attic.
export { ATTIC_AIR_CHANGES_PER_HOUR, ceilingFlux } from "./balance/attic.ts";
export type { ZeroSearch } from "./balance/find-zero.ts";
// Zero of a rising function.
export { findZero } from "./balance/find-zero.ts";
export type { BalanceHour } from "./balance/house-balance.ts";
// The house at one steady hour: every path, the heat needed, where it settles.
export { houseBalance, withOtherHeat } from "./balance/house-balance.ts";
export type { AirFlows, HouseLosses, HouseShell, ShellHour } from "./balance/house-losses.ts";
// Losses of a house by path.
export { houseLosses } from "./balance/house-losses.ts";
export type { ShellInput } from "./balance/prepare-shell.ts";
// A house's surfaces with cover, view and screen made ready for many hours.
export { coverIsWet, prepareShell } from "./balance/prepare-shell.ts";
// Air past a closed screen.
export { screenLeakageM3HM2 } from "./balance/screen-air.ts";
// Settling temperature and verdict.
export { settlesAtC } from "./balance/settle.ts";
// A solid ceiling's U-value.
export { ceilingUValueWM2K } from "./balance/stack-resistance.ts";
export type { StackSurface } from "./balance/stack-surface.ts";
export { prepareStackFlux } from "./balance/stack-surface.ts";
export type {
  FluxGroup,
  OutsideHour,
  ScreenPosition,
  SurfaceFlux,
  SurfaceModel,
} from "./balance/surface-model.ts";
export type { TypedRule } from "./balance/typed-surface.ts";
// Covers given as one U-value: wind, screen, share to the sky.
export { screenedUValueWM2K, typedFlux } from "./balance/typed-surface.ts";
export {
  outsideFilmWM2K,
  skyShareOfTypedLossFrac,
  TABLE_WIND_MS,
  uValueAtWindWM2K,
} from "./balance/typed-u-value.ts";
export { HOLDS_WITHIN_K, holdVerdict } from "./balance/verdict.ts";
export type { OutsideView } from "./balance/view.ts";
export { outsideView } from "./balance/view.ts";
export type { RoomHour, RoomHourResult, RoomMass } from "./energy/day-run.ts";
// A typical day run until it repeats itself, with one mass node and a heater limit.
export { runTypicalDay } from "./energy/day-run.ts";
export type { MonthEnergyInput } from "./energy/month-energy.ts";
// Energy of a month from typical days.
export { monthEnergy } from "./energy/month-energy.ts";
export type { MonthSun, MonthSunInput } from "./energy/month-sun.ts";
// Sun on the surfaces and into the room through a month's mean day.
export { monthSun } from "./energy/month-sun.ts";
export type { Parabola } from "./energy/parabola.ts";
export { parabolaAt, parabolaThrough } from "./energy/parabola.ts";
export type { ShellResponse } from "./energy/shell-response.ts";
// How a shell answers to a month's weather.
export { responseLossW, shellResponse } from "./energy/shell-response.ts";
export type { GovernedAir, HouseAir } from "./plan/house-air.ts";
// Air and stock of a house in one month.
export { houseAir } from "./plan/house-air.ts";
export type {
  Assembly,
  CropInput,
  FuelInput,
  HeaterInput,
  HousePart,
  HousePlanInput,
  MonthUse,
  ScreenInput,
  StockInput,
} from "./plan/house-input.ts";
export type { HouseModel } from "./plan/house-model.ts";
// A house's sizes and shells, worked out once.
export { houseModel } from "./plan/house-model.ts";
export type { NightInput } from "./plan/night-balances.ts";
// A design night in every state that matters.
export { designSetpointC, insideHumidityFrac, nightBalances, usualNight } from "./plan/night-balances.ts";
// Why no heater is the right answer.
export { isColdHoused, noHeaterReason } from "./plan/no-heater.ts";
// Parts of a plan: fuel of the year, climate of the site, a month's energy, the months, the sizing.
export { meanEfficiencyFrac, planAnnual } from "./plan/plan-annual.ts";
export type { PlanClimate } from "./plan/plan-climate.ts";
export { planClimate } from "./plan/plan-climate.ts";
export { planMonthEnergy } from "./plan/plan-energy.ts";
// The whole plan of a house.
export { planHouse } from "./plan/plan-house.ts";
export { planMonths } from "./plan/plan-months.ts";
export { PICKUP_MARGIN_FRAC, planSizing } from "./plan/plan-sizing.ts";
export type {
  GainPath,
  HoldVerdict,
  HouseBalance,
  HouseStateId,
  InputOrigin,
  LossPath,
  MonthClimate,
  MonthEnergy,
  MonthResult,
  PlanAssumption,
  PlanResult,
  PlanSizing,
  PlanWarning,
  SurfaceFlow,
} from "./plan/plan-types.ts";
export type { HeaterOption, HeaterUnit } from "./plan/sizing-types.ts";
// Animals' heat at the low of their night.
export { nightLowRatio } from "./plan/stock-night.ts";
export type { CoolingHouse, HoursRange } from "./sizing/hours-to-critical.ts";
// Hours until the critical temperature when all heat stops.
export { hoursToCritical } from "./sizing/hours-to-critical.ts";
// Fitted heaters by what they really give.
export { installedUnits, totalOutputW, unitOutputsW } from "./sizing/installed-units.ts";
export type { OptionJudge } from "./sizing/judge-options.ts";
// Ways of fitting a house, each judged on both nights.
export { judgedOptions } from "./sizing/judge-options.ts";
export type { Source } from "./sources.ts";
// Every source the engine cites, by its key.
export { engineSources } from "./sources.ts";
