/** Where the values in constants.ts and units.ts come from. */
export const basicSources = {
  SI2019: {
    author: "BIPM",
    year: 2019,
    title: "The International System of Units, 9th edition",
    read: "from memory",
  },
  ISO2533: { author: "ISO", year: 1975, title: "ISO 2533 Standard atmosphere", read: "from memory" },
  KOPP2011: {
    author: "Kopp, G. and Lean, J. L.",
    year: 2011,
    title: "A new, lower value of total solar irradiance, Geophysical Research Letters 38, L01706",
    read: "from memory",
  },
  NIST811: {
    author: "Thompson, A. and Taylor, B. N.",
    year: 2008,
    title: "NIST Special Publication 811, appendix B",
    read: "from memory",
  },
} as const;
