import type { Sequelize } from "sequelize";
import { Assembly } from "./assembly.ts";
import { Building } from "./building.ts";
import { CalendarMonth } from "./calendar-month.ts";
import { ClimateStation } from "./climate-station.ts";
import { Cooperative } from "./cooperative.ts";
import { Farm } from "./farm.ts";
import { FarmEvent } from "./farm-event.ts";
import { FarmPerson } from "./farm-person.ts";
import { Heater } from "./heater.ts";
import { Membership } from "./membership.ts";
import { Person } from "./person.ts";
import { Plan } from "./plan.ts";
import { PlanMessage } from "./plan-message.ts";

const models = [
  Cooperative,
  Person,
  Membership,
  Farm,
  FarmPerson,
  ClimateStation,
  Building,
  Assembly,
  CalendarMonth,
  Heater,
  Plan,
  PlanMessage,
  FarmEvent,
];

/**
 * Binds every model to one connection. The only file that knows them all: models import no models, so no cycle can grow.
 * Rows are fetched by explicit keys in the services; Sequelize's own association loading is not used.
 */
export function bindModels(sequelize: Sequelize): void {
  for (const model of models) model.define(sequelize);
}
