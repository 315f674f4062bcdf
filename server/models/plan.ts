import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { PlanStatus, PlanSummary } from "../contracts/buildings.ts";
import type { PlanChoices } from "../contracts/plans.ts";
import type { Survey } from "../contracts/survey.ts";
import type { HousePlanInput } from "../engine/plan/house-input.ts";
import type { PlanResult } from "../engine/plan/plan-types.ts";

/** The few figures lists need, so that they never load a whole result. */
export type StoredPlanSummary = Omit<PlanSummary, "id" | "number" | "status" | "createdAt" | "outdated"> & {
  /** Where the house stood and whose weather was used; a plan for another place is out of date. */
  place: PlanPlace;
};

export interface PlanPlace {
  latitudeDeg: number;
  longitudeDeg: number;
  stationId: string;
}

export class Plan extends Model<InferAttributes<Plan>, InferCreationAttributes<Plan>> {
  declare id: CreationOptional<string>;
  declare buildingId: string;
  declare number: number;
  declare status: CreationOptional<PlanStatus>;
  declare surveyVersion: number;
  declare engineVersion: string;
  declare choices: PlanChoices;
  declare survey: Survey;
  declare engineInput: HousePlanInput;
  declare result: PlanResult;
  declare summary: StoredPlanSummary;
  declare proposedOptionId: CreationOptional<string | null>;
  declare createdBy: CreationOptional<string | null>;
  declare sentAt: CreationOptional<Date | null>;
  declare answeredAt: CreationOptional<Date | null>;
  declare answeredBy: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static define(sequelize: Sequelize): void {
    Plan.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        buildingId: { type: DataTypes.UUID, allowNull: false },
        number: { type: DataTypes.INTEGER, allowNull: false },
        status: { type: DataTypes.STRING(10), allowNull: false, defaultValue: "draft" },
        surveyVersion: { type: DataTypes.INTEGER, allowNull: false },
        engineVersion: { type: DataTypes.STRING(20), allowNull: false },
        choices: { type: DataTypes.JSON, allowNull: false },
        survey: { type: DataTypes.JSON, allowNull: false },
        engineInput: { type: DataTypes.JSON, allowNull: false },
        result: { type: DataTypes.JSON, allowNull: false },
        summary: { type: DataTypes.JSON, allowNull: false },
        proposedOptionId: { type: DataTypes.STRING(60), allowNull: true },
        createdBy: { type: DataTypes.UUID, allowNull: true },
        sentAt: { type: DataTypes.DATE(3), allowNull: true },
        answeredAt: { type: DataTypes.DATE(3), allowNull: true },
        answeredBy: { type: DataTypes.UUID, allowNull: true },
        createdAt: DataTypes.DATE(3),
        updatedAt: DataTypes.DATE(3),
      },
      { sequelize, tableName: "plans", modelName: "plan" },
    );
  }
}
