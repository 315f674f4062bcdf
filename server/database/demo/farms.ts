/** An invented member farm, placed in a real region so that its weather is real. */
export interface DemoFarm {
  key: string;
  name: string;
  place: string;
  latitudeDeg: number;
  longitudeDeg: number;
  /** Keys of demo people. */
  advisor: string;
  farmer: string;
  sharedWithManager: boolean;
}

export const demoCooperative = { name: "Two Tides Farm Co-operative", country: "IE" } as const;

export const demoFarms: DemoFarm[] = [
  {
    key: "saltmarsh",
    name: "Saltmarsh Glass",
    place: "Westland coast",
    latitudeDeg: 51.98,
    longitudeDeg: 4.26,
    advisor: "ines",
    farmer: "joost",
    sharedWithManager: true,
  },
  {
    key: "kestrel",
    name: "Kestrel Hollow",
    place: "northern Vermont",
    latitudeDeg: 44.52,
    longitudeDeg: -72.98,
    advisor: "rurik",
    farmer: "nell",
    sharedWithManager: true,
  },
  {
    key: "bench",
    name: "High Bench Growers",
    place: "Front Range, Colorado",
    latitudeDeg: 40.12,
    longitudeDeg: -105.12,
    advisor: "rurik",
    farmer: "abel",
    sharedWithManager: false,
  },
  {
    key: "wirrabel",
    name: "Wirrabel Poultry",
    place: "southern tablelands",
    latitudeDeg: -34.79,
    longitudeDeg: 149.62,
    advisor: "moana",
    farmer: "tilly",
    sharedWithManager: true,
  },
  {
    key: "cedar",
    name: "Cedar Fork Pigs",
    place: "central Iowa",
    latitudeDeg: 42.05,
    longitudeDeg: -93.48,
    advisor: "rurik",
    farmer: "dora",
    sharedWithManager: true,
  },
  {
    key: "vent",
    name: "Ferme du Vent",
    place: "central Brittany",
    latitudeDeg: 48.09,
    longitudeDeg: -2.95,
    advisor: "ines",
    farmer: "yann",
    sharedWithManager: true,
  },
  {
    key: "elvegard",
    name: "Nordre Elvegard",
    place: "lower Telemark",
    latitudeDeg: 59.24,
    longitudeDeg: 9.52,
    advisor: "ines",
    farmer: "sigrun",
    sharedWithManager: false,
  },
  {
    key: "oies",
    name: "Rang des Oies",
    place: "Ottawa valley",
    latitudeDeg: 45.42,
    longitudeDeg: -75.2,
    advisor: "rurik",
    farmer: "margot",
    sharedWithManager: true,
  },
  {
    key: "tussock",
    name: "Lower Tussock",
    place: "Southland plains",
    latitudeDeg: -46.31,
    longitudeDeg: 168.41,
    advisor: "moana",
    farmer: "hemi",
    sharedWithManager: true,
  },
  {
    key: "poults",
    name: "Prairie Poults",
    place: "western Minnesota",
    latitudeDeg: 45.58,
    longitudeDeg: -95.88,
    advisor: "rurik",
    farmer: "gus",
    sharedWithManager: false,
  },
  {
    key: "laguna",
    name: "Laguna Clara",
    place: "Mar del Plata",
    latitudeDeg: -37.99,
    longitudeDeg: -57.72,
    advisor: "moana",
    farmer: "lucia",
    sharedWithManager: true,
  },
  {
    key: "glenbower",
    name: "Glenbower Plants",
    place: "Irish midlands",
    latitudeDeg: 53.36,
    longitudeDeg: -7.48,
    advisor: "ines",
    farmer: "fionn",
    sharedWithManager: true,
  },
];
