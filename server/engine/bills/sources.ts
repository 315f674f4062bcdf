/** Where the methods of comparing a model with bills come from. */
export const billSources = {
  GUIDELINE14: {
    author: "ASHRAE",
    year: 2014,
    title: "Guideline 14 Measurement of energy, demand and water savings",
    part: "monthly 5 % NMBE and 15 % CV(RMSE), hourly 10 % and 30 %; one parameter for a simulation",
    read: "from memory",
  },
  FELS1986: {
    author: "Fels, M. F.; Rachlin, J. et al.",
    year: 1986,
    title: "PRISM: an introduction, Energy and Buildings 9",
    part: "degree-day model, normalised consumption; ten readings at least",
    read: "read",
  },
  IPMVP: {
    author: "Efficiency Valuation Organization",
    year: 2012,
    title: "International performance measurement and verification protocol, option C",
    part: "savings above 10 % or twice the scatter",
    read: "from memory",
  },
  BILLSLIPS: {
    author: "common practice",
    year: 0,
    title:
      "Usual slips of fuel records: unit mistaken, factor of ten, house on the same meter, deliveries taken for use",
    read: "common practice",
  },
} as const;
