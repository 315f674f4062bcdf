import type { Role } from "../../server/contracts/people.ts";

export interface NavigationCell {
  to: string;
  label: string;
  /** Shows how many plans wait for the person. */
  counts?: boolean;
}

/** The cells of the head, by the role a person works under. */
export const navigation: Record<Role, NavigationCell[]> = {
  advisor: [
    { to: "/map", label: "Map" },
    { to: "/farms", label: "Farms" },
    { to: "/reviews", label: "Reviews", counts: true },
  ],
  farmer: [
    { to: "/farms", label: "My farm" },
    { to: "/reviews", label: "Review a plan", counts: true },
  ],
  manager: [
    { to: "/sites", label: "Compare sites" },
    { to: "/farms", label: "Farms" },
    { to: "/people", label: "People" },
  ],
};

export const roleWords: Record<Role, string> = {
  advisor: "Adviser",
  farmer: "Farmer",
  manager: "Co-op manager",
};
