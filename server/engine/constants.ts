/** Stefan-Boltzmann constant, W/(m² K⁴). Source [SI2019]: follows from the exact h, k and c of the 2019 SI. */
export const STEFAN_BOLTZMANN_WM2K4 = 5.670374419e-8;

/** 0 °C in kelvin, exact by definition. Source [SI2019]. */
export const ZERO_CELSIUS_K = 273.15;

/** Standard atmospheric pressure at sea level, Pa. Source [ISO2533]. */
export const STANDARD_PRESSURE_PA = 101_325;

/** Mean solar irradiance outside the atmosphere at one astronomical unit, W/m². Source [KOPP2011]. */
export const SOLAR_CONSTANT_WM2 = 1361;
