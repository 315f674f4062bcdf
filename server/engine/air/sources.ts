export const airSources = {
  "ASHRAE-F17": {
    author: "ASHRAE",
    year: 2017,
    title: "Handbook, Fundamentals (SI)",
    part: "chapter 1, psychrometrics",
    read: "from memory",
  },
  "EN-13788": {
    author: "CEN / ISO",
    year: 2012,
    title: "EN ISO 13788 Hygrothermal performance of building components, inner surface temperature",
    read: "from memory",
  },
} as const;
