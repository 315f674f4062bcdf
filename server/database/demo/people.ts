import type { Role } from "../../contracts/people.ts";

/** An invented person of the demonstration co-operative. */
export interface DemoPerson {
  key: string;
  name: string;
  email: string;
  roles: Role[];
  units: "si" | "us";
  /** What the sign-in chooser prints under the name. */
  role: string;
  farm: string;
}

function person(key: string, name: string, role: Role, farm: string, units: "si" | "us" = "si"): DemoPerson {
  const words: Record<Role, string> = { advisor: "Adviser", farmer: "Farmer", manager: "Co-op manager" };
  const email = `${name
    .toLowerCase()
    .normalize("NFD")
    .replace(/[^a-z ]/g, "")
    .replace(/ /g, ".")}@twotides.example`;
  return { key, name, email, roles: [role], units, role: words[role], farm };
}

/** Everybody in the demonstration. Names, addresses and farms are invented. */
export const demoPeople: DemoPerson[] = [
  person("ines", "Ines Calloway", "advisor", "north-west Europe"),
  person("rurik", "Rurik Lindqvist", "advisor", "North America", "us"),
  person("moana", "Moana Teller", "advisor", "southern members"),
  person("brigid", "Brigid Farthing", "manager", "Two Tides Farm Co-operative"),
  person("oskar", "Oskar Quill", "manager", "Two Tides Farm Co-operative"),
  person("wanda", "Wanda Hathersage", "manager", "Two Tides Farm Co-operative"),
  person("joost", "Joost Zandhoek", "farmer", "Saltmarsh Glass"),
  person("nell", "Nell Corrigan", "farmer", "Kestrel Hollow", "us"),
  person("abel", "Abel Duquesne", "farmer", "High Bench Growers", "us"),
  person("tilly", "Tilly Warragul", "farmer", "Wirrabel Poultry"),
  person("dora", "Dora Lindemann", "farmer", "Cedar Fork Pigs", "us"),
  person("yann", "Yann Kermoal", "farmer", "Ferme du Vent"),
  person("sigrun", "Sigrun Elvegard", "farmer", "Nordre Elvegard"),
  person("margot", "Margot Beausoleil", "farmer", "Rang des Oies"),
  person("hemi", "Hemi Rangitoto", "farmer", "Lower Tussock"),
  person("gus", "Gus Okerlund", "farmer", "Prairie Poults", "us"),
  person("lucia", "Lucia Ferreyra", "farmer", "Laguna Clara"),
  person("fionn", "Fionn Glasheen", "farmer", "Glenbower Plants"),
];
