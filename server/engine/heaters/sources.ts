export const heaterSources = {
  NFPA54: {
    author: "NFPA",
    year: 2021,
    title: "NFPA 54 National Fuel Gas Code; heater installation manuals",
    part: "4 % less for each 1000 ft above the sea, from 2000 ft upwards",
    read: "from memory",
  },
  "CSA-B149": {
    author: "CSA Group",
    year: 2020,
    title: "B149.1 Natural gas and propane installation code",
    part: "a tenth less between 2000 and 4500 ft",
    read: "from memory",
  },
  STOICHIOMETRY: {
    author: "common practice",
    year: 0,
    title: "Complete combustion of methane, propane, butane and kerosene; molar masses, heating values",
    read: "common practice",
  },
  STAFFELL2012: {
    author: "Staffell, I., Brett, D., Brandon, N. and Hawkes, A.",
    year: 2012,
    title: "A review of domestic heat pumps, Energy and Environmental Science 5",
    part: "COP against the temperature lift, air and ground source; quoted second-hand",
    read: "from memory",
  },
  LICHARZ2020: {
    author: "Licharz, H. et al.",
    year: 2020,
    title: "Energy efficiency of a heat pump system in a pig house",
    part: "COP 2.5 to 3.4 measured by boundary",
    read: "read",
  },
  STAGING: {
    author: "common practice",
    year: 0,
    title: "Stages of heaters, turndown, loss of short cycles, two units at 60 to 67 % each",
    read: "common practice",
  },
  "SIZE-STEPS": {
    author: "common practice",
    year: 0,
    title: "Steps in which heaters are commonly rated, kBtu/h input",
    read: "common practice",
  },
} as const;
