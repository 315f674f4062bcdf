/** Where the rules that join the methods into a plan come from. */
export const planSources = {
  DESIGNNIGHT: {
    author: "trade practice",
    year: 2026,
    title: "Design nights: dark, no lamps, clear sky, mean wind of the month, outdoor air at 85 % humidity",
    read: "common practice",
  },
  BARNRULE: {
    author: "trade practice",
    year: 2026,
    title:
      "Barns: animal heat at its low of the night, ventilation set for the wanted temperature and left there",
    read: "common practice",
  },
  ACTIVITY: {
    author: "Pedersen, S. and Sällvik, K. (eds.)",
    year: 2002,
    title: "4th report of the working group on climatization of animal houses, CIGR",
    part: "daily course of animal activity; amplitudes typical",
    read: "from memory",
  },
  PLANMARGIN: {
    author: "trade practice",
    year: 2026,
    title: "Pick-up margin of 10 to 25 % on the everyday design need",
    read: "common practice",
  },
  CONFUSIONS: {
    author: "trade practice",
    year: 2026,
    title:
      "Usual slips of surveys: input for output, thin air, ventilation blank, northern calendar in the south",
    read: "common practice",
  },
} as const;
