import { z } from "zod";
import { idSchema, nameSchema, positionSchema } from "./common.ts";

export const createFarmRequest = z.object({
  body: z.strictObject({
    cooperativeId: idSchema,
    name: nameSchema("Farm name"),
    place: nameSchema("Place"),
    position: positionSchema,
    farmerEmail: z.email("Write a full e-mail address, such as name@example.org.").max(200).nullable(),
    farmerName: nameSchema("Farmer's name").nullable(),
  }),
});

export const updateFarmRequest = z.object({
  params: z.object({ id: idSchema }),
  body: z.strictObject({
    name: nameSchema("Farm name").optional(),
    place: nameSchema("Place").optional(),
    position: positionSchema.optional(),
    /** The farmer's own choice: may the co-operative's manager open survey and plan, not only the result? */
    sharedWithManager: z.boolean().optional(),
  }),
});

export const assignAdvisorRequest = z.object({
  params: z.object({ id: idSchema }),
  body: z.strictObject({ personId: idSchema }),
});

export interface FarmPersonView {
  id: string;
  name: string;
  email: string;
  role: "advisor" | "farmer";
}

export interface FarmView {
  id: string;
  cooperativeId: string;
  name: string;
  place: string;
  latitudeDeg: number;
  longitudeDeg: number;
  sharedWithManager: boolean;
  people: FarmPersonView[];
  buildingCount: number;
  can: { update: boolean; addBuilding: boolean; assign: boolean; share: boolean; delete: boolean };
}
