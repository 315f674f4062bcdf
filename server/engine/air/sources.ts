export const airSources = {
  "ASHRAE-F17": {
    author: "ASHRAE",
    year: 2017,
    title: "Handbook, Fundamentals (SI)",
    part: "chapter 1, psychrometrics",
    read: "from memory",
  },
  "ASHRAE-VENT": {
    author: "ASHRAE",
    year: 2015,
    title: "Handbook, HVAC Applications",
    part: "environmental control for animals and plants",
    read: "from memory",
  },
} as const;
