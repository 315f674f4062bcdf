/** Where heating values, emission factors and the counting of fuel come from. */
export const fuelSources = {
  HEATINGVALUE: {
    author: "common practice",
    year: 0,
    title: "Gross and net heating value; energy of a fuel by mass, volume or meter",
    read: "common practice",
  },
  EPAHUB2024: {
    author: "US Environmental Protection Agency",
    year: 2024,
    title: "GHG emission factors hub",
    part: "stationary combustion, gross heating value",
    read: "read",
  },
  IPCC2006: {
    author: "IPCC",
    year: 2006,
    title: "Guidelines for national greenhouse gas inventories, volume 2",
    part: "default emission factors on the net heating value",
    read: "from memory",
  },
  IPCC2013: {
    author: "IPCC",
    year: 2013,
    title: "Fifth assessment report, working group I, table 8.7; fourth report, table 2.14",
    part: "warming of methane and nitrous oxide over a hundred years",
    read: "from memory",
  },
  WOODVALUE: {
    author: "common practice",
    year: 0,
    title: "Heating value of wood: 18.9 MJ/kg dry net, 2.443 MJ/kg for its water",
    read: "common practice",
  },
  VOLUMES: {
    author: "common practice",
    year: 0,
    title: "Expansion of liquid fuels, volume of gases by pressure and temperature",
    read: "common practice",
  },
  TARIFF: {
    author: "common practice",
    year: 0,
    title: "Standing charge, blocks, levies and value added tax of fuel bills",
    read: "common practice",
  },
} as const;
