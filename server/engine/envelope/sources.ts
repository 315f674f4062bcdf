export const envelopeSources = {
  ISO6946: {
    author: "ISO",
    year: 2017,
    title: "ISO 6946 Building components, thermal resistance and transmittance",
    part: "surface resistances, air layers (annex), combined method",
    read: "from memory",
  },
  "TARP-1983": {
    author: "Walton, G. N.",
    year: 1983,
    title: "Thermal Analysis Research Program reference manual, NBSIR 83-2655",
    part: "natural convection by tilt, split of the sky view",
    read: "from memory",
  },
  WATMUFF1977: {
    author: "Watmuff, J. H., Charters, W. W. S. and Proctor, D.",
    year: 1977,
    title: "Solar and wind induced external coefficients for solar collectors",
    read: "from memory",
  },
  MCADAMS1954: {
    author: "McAdams, W. H.",
    year: 1954,
    title: "Heat transmission, 3rd edition",
    read: "from memory",
  },
  GARZOLI1981: {
    author: "Garzoli, K. V. and Blackwell, J.",
    year: 1981,
    title: "An analysis of the nocturnal heat loss from a single skin plastic greenhouse",
    read: "from memory",
  },
  PAPADAKIS1992: {
    author: "Papadakis, G., Frangoudakis, A. and Kyritsis, S.",
    year: 1992,
    title: "Mixed, forced and free convection heat transfer at the greenhouse cover",
    read: "from memory",
  },
  BOT1983: {
    author: "Bot, G. P. A.",
    year: 1983,
    title: "Greenhouse climate: from physical processes to a dynamic model",
    read: "from memory",
  },
  "BERDAHL-MARTIN1984": {
    author: "Berdahl, P. and Martin, M.",
    year: 1984,
    title: "Emissivity of clear skies, Solar Energy 32(5)",
    read: "from memory",
  },
  UNSWORTH1975: {
    author: "Unsworth, M. H. and Monteith, J. L.",
    year: 1975,
    title: "Long-wave radiation at the ground",
    read: "from memory",
  },
  SKY: {
    author:
      "Swinbank 1963; Brunt 1932; Brutsaert 1975; Berdahl and Fromberg 1982; Clark and Allen 1978; Idso and Jackson 1969; Prata 1996",
    year: 1996,
    title: "Clear-sky emissivity formulas, each under its author's name",
    read: "from memory",
  },
  NETWORK: {
    author: "Modest, M. F.",
    year: 2013,
    title: "Radiative heat transfer, 3rd edition",
    part: "radiosity network of grey, partly transparent plates",
    read: "from memory",
  },
} as const;
