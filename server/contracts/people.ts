import { z } from "zod";
import { idSchema, nameSchema } from "./common.ts";

export const roles = ["advisor", "farmer", "manager"] as const;
export const roleSchema = z.enum(roles);
export type Role = z.infer<typeof roleSchema>;

export const themes = ["day", "evening", "system"] as const;
export const unitSystems = ["si", "us"] as const;

export interface MembershipView {
  cooperativeId: string;
  cooperativeName: string;
  role: Role;
}

/** Answer of GET /api/me. */
export interface MeView {
  id: string;
  name: string;
  email: string;
  units: (typeof unitSystems)[number];
  theme: (typeof themes)[number];
  memberships: MembershipView[];
  /** The membership the person is working under. */
  activeRole: Role | null;
  activeCooperativeId: string | null;
  csrfToken: string;
  /** Reviews that wait for this person. */
  openReviews: number;
}

export const changePreferencesRequest = z.object({
  body: z.strictObject({
    units: z.enum(unitSystems).optional(),
    theme: z.enum(themes).optional(),
    activeRole: roleSchema.optional(),
    activeCooperativeId: idSchema.optional(),
  }),
});

export const invitePersonRequest = z.object({
  params: z.object({ id: idSchema }),
  body: z.strictObject({
    name: nameSchema("Name"),
    email: z.email("Write a full e-mail address, such as name@example.org.").max(200),
    role: roleSchema,
  }),
});

export const removePersonRequest = z.object({
  params: z.object({ id: idSchema, personId: idSchema, role: roleSchema }),
});

export interface PersonView {
  id: string;
  name: string;
  email: string;
  roles: Role[];
  hasSignedIn: boolean;
  farmNames: string[];
}
