export const livestockSources = {
  CIGR2002: {
    author: "Pedersen, S. and Sällvik, K. (eds.)",
    year: 2002,
    title: "4th report of the working group on climatization of animal houses, CIGR",
    part: "heat and moisture production at animal and house level",
    read: "from memory",
  },
  PEDERSEN2008: {
    author: "Pedersen, S. et al.",
    year: 2008,
    title: "Carbon dioxide production in animal houses, CIGR E-Journal 10",
    part: "0.185 m3/h per 1000 W",
    read: "read",
  },
  "EU-2007-43": {
    author: "European Union",
    year: 2007,
    title: "Directive 2007/43/EC, annex II",
    part: "3000 ppm carbon dioxide, 70 % humidity",
    read: "read",
  },
} as const;
