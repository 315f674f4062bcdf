/** Where the rules of the month's energy come from. */
export const energySources = {
  ISO13790: {
    author: "ISO",
    year: 2008,
    title: "ISO 13790 Energy performance of buildings",
    part: "one lumped mass node behind the air, gains shared between air and mass, capped heating power",
    read: "from memory",
  },
  SOILMASS: {
    author: "trade practice",
    year: 2026,
    title:
      "Heat held by the top 0.1 m of moist soil or concrete, about 2.2e5 J/(m² K); floor to air about 6 W/(m² K)",
    read: "common practice",
  },
  IMPLICITEULER: {
    author: "Süli, E. and Mayers, D.",
    year: 2003,
    title: "An Introduction to Numerical Analysis",
    part: "implicit Euler method",
    read: "from memory",
  },
  LAGRANGE: {
    author: "Abramowitz, M. and Stegun, I. A.",
    year: 1964,
    title: "Handbook of Mathematical Functions, NBS",
    part: "25.2 interpolation through three points",
    read: "from memory",
  },
  LAMPHEAT: {
    author: "trade practice",
    year: 2026,
    title: "0.7 to 0.9 of lamp power warms the air",
    read: "common practice",
  },
  FRESNEL: {
    author: "Duffie, J. A. and Beckman, W. A.",
    year: 2013,
    title: "Solar engineering of thermal processes, chapter 5",
    part: "transmittance of film and glass for diffuse light against a right angle",
    read: "from memory",
  },
  ALBEDO: {
    author: "trade practice",
    year: 2026,
    title: "Crop and floor send 0.10 to 0.25 of the sun out again",
    read: "common practice",
  },
  VENTPOINT: {
    author: "trade practice",
    year: 2026,
    title: "Vents open about 3 K above the day set-point",
    read: "common practice",
  },
  CLOUDDAYS: {
    author: "trade practice",
    year: 2026,
    title: "A month's days in three sorts of brightness around its mean",
    read: "common practice",
  },
} as const;
