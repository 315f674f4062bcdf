export const heaterSources = {
  NFPA54: {
    author: "NFPA",
    year: 2021,
    title: "NFPA 54 National Fuel Gas Code; heater installation manuals",
    part: "4 % less for each 1000 ft above the sea, from 2000 ft upwards",
    read: "from memory",
  },
  STOICHIOMETRY: {
    author: "common practice",
    year: 0,
    title: "Complete combustion of methane and propane",
    read: "common practice",
  },
  "SIZE-STEPS": {
    author: "common practice",
    year: 0,
    title: "Steps in which heaters are commonly rated, kBtu/h input",
    read: "common practice",
  },
} as const;
