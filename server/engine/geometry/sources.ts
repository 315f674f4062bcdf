/** Closed forms of plane and solid geometry need no source; this names the one rule that is not a closed form. */
export const geometrySources = {
  "ISO-VIEW": {
    author: "common practice",
    year: 0,
    title:
      "Isotropic view factor of a tilted plane to the sky, (1 + cos tilt) / 2; facing slopes of a range see each other",
    read: "common practice",
  },
} as const;
