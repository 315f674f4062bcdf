/** Where the reckoning of money comes from. */
export const moneySources = {
  DISCOUNTING: {
    author: "Fuller, S. K. and Petersen, S. R.",
    year: 1996,
    title: "Life-cycle costing manual, NIST Handbook 135",
    part: "present value, annuities, payback, internal rate",
    read: "from memory",
  },
} as const;
