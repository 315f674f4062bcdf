/** Where the rules of the house balance come from. */
export const balanceSources = {
  ASHRAEAPP: {
    author: "ASHRAE",
    year: 2019,
    title: "Handbook of HVAC Applications, Environmental control for animals and plants",
    part: "design loss = sum of U A dT + air change + perimeter; table values at about 6.7 m/s (15 mph)",
    read: "from memory",
  },
  WALTON1983: {
    author: "Walton, G. N.",
    year: 1983,
    title: "Thermal Analysis Research Program reference manual, NBSIR 83-2655",
    part: "near-horizon sky radiates like the air: share sqrt(F) of the sky's view factor goes to the sky proper",
    read: "from memory",
  },
  AIRHEAT: {
    author: "ASHRAE",
    year: 2021,
    title: "Handbook of Fundamentals, chapter 18",
    part: "1.2 kg/m³ and 1006 J/(kg K): 0.3353 Wh/(m³ K) at sea level, in proportion to pressure",
    read: "from memory",
  },
  LEAKFANS: {
    author: "trade practice",
    year: 2026,
    title: "Under exhaust fans leakage is part of the fan flow until wind alone moves more air",
    read: "common practice",
  },
  DOWELL1971: {
    author: "Dowell, M. and Jarratt, P.",
    year: 1971,
    title: "A modified regula falsi method for computing the root of an equation, BIT 11",
    read: "from memory",
  },
  THERMOSTAT: {
    author: "trade practice",
    year: 2026,
    title: "Thermostats swing by some tenths of a degree and more",
    read: "common practice",
  },
  BOTRULE: {
    author: "trade practice",
    year: 2026,
    title:
      "Outside convection: Watmuff for single houses, Bot for ranges of a hectare and more, 4 + 4v for barns",
    read: "common practice",
  },
  WETRULE: {
    author: "Feuilloley, M. and Issanchou, G.",
    year: 1996,
    title:
      "Greenhouse covering materials measurement and modelling using the hot box method, and condensation effects",
    part: "abstract: condensation changes the loss of films; a cropped house is taken as wet inside",
    read: "read",
  },
  SNOWRULE: {
    author: "trade practice",
    year: 2026,
    title:
      "Screens are opened while it snows, at about -2 °C under an overcast sky, so that the roof sheds its load",
    read: "common practice",
  },
  ATTICAIR: {
    author: "trade practice",
    year: 2026,
    title: "Ventilated attics of barns: about 3 air changes an hour in winter",
    read: "common practice",
  },
  SCREENTABLE: {
    author: "Bartok, J. W. and eXtension",
    year: 2012,
    title: "Thermal curtains: share of heat saved through the covered area",
    read: "read",
  },
  SLOTAIR: {
    author: "trade practice",
    year: 2026,
    title: "Air passes an open screen edge at about 0.2 m/s",
    read: "common practice",
  },
} as const;
