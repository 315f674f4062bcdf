export const failureSources = {
  LUMPED: {
    author: "Incropera, F. P. and DeWitt, D. P.",
    year: 2007,
    title: "Fundamentals of heat and mass transfer, 6th edition",
    part: "chapter 5, lumped capacitance",
    read: "from memory",
  },
} as const;
