import type { Transaction } from "sequelize";
import { Building } from "../../models/building.ts";
import { Farm } from "../../models/farm.ts";
import type { Actor } from "../../policies/actor.ts";
import { buildingPolicy } from "../../policies/farm-policy.ts";
import { authorize } from "../../policies/policy.ts";

/** Loads a building with its farm and checks that the person may do `action` with it. */
export async function loadBuilding(
  id: string,
  action: keyof typeof buildingPolicy,
  actor: Actor,
  transaction: Transaction,
): Promise<{ building: Building; farm: Farm }> {
  const building = await Building.findByPk(id, { transaction });
  const farm = building === null ? null : await Farm.findByPk(building.farmId, { transaction });
  authorize(actor, buildingPolicy, action, farm, "That building");
  return { building: building as Building, farm };
}
