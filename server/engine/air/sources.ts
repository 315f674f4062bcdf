export const airSources = {
  "ASHRAE-F17": {
    author: "ASHRAE",
    year: 2017,
    title: "Handbook, Fundamentals (SI)",
    part: "chapter 1, psychrometrics",
    read: "from memory",
  },
} as const;
