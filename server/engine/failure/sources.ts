export const failureSources = {
  LUMPED: {
    author: "Incropera, F. P. and DeWitt, D. P.",
    year: 2007,
    title: "Fundamentals of heat and mass transfer, 6th edition",
    part: "chapter 5, lumped capacitance",
    read: "from memory",
  },
  MIXEDAIR: {
    author: "common practice",
    year: 0,
    title: "Balance of a gas in well-mixed air with a steady source and a steady air change",
    read: "common practice",
  },
  STILLAIR: {
    author:
      "Robert, M. (University of Illinois); University of Kentucky, Poultry production manual, chapter 7",
    year: 0,
    title: "Nursery pigs with fans off; survival of poultry in still hot air",
    part: "4 % carbon dioxide at about 80 min; 20 to 30 min above 97 °F; harm above 30 000 ppm",
    read: "read",
  },
  ALARMS: {
    author: "common practice",
    year: 0,
    title: "Alarms 3 to 4 K under and 5 to 6 K over the set-point; standby generators, tested weekly",
    read: "common practice",
  },
} as const;
