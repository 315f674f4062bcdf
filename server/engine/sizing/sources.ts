/** Where the rules of heater sizing come from. */
export const sizingSources = {
  COOLINGMASS: {
    author: "trade practice",
    year: 2026,
    title:
      "Heat held for some hours: 3 to 5 times the air's own for air and fittings, 25 mm of floor at 2.1 MJ/(m³ K)",
    read: "common practice",
  },
  COLDHOUSED: {
    author: "trade practice",
    year: 2026,
    title:
      "Calves, cattle, sheep and horses are kept in dry, draught-free barns without heat; the sick and newborn get a warm pen",
    read: "common practice",
  },
} as const;
