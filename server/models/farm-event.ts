import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** Who changed what, and when. Rows are only added. */
export class FarmEvent extends Model<InferAttributes<FarmEvent>, InferCreationAttributes<FarmEvent>> {
  declare id: CreationOptional<string>;
  declare farmId: string;
  declare buildingId: string | null;
  declare personId: string | null;
  declare action: string;
  declare detail: Record<string, unknown>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static define(sequelize: Sequelize): void {
    FarmEvent.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        farmId: { type: DataTypes.UUID, allowNull: false },
        buildingId: { type: DataTypes.UUID, allowNull: true },
        personId: { type: DataTypes.UUID, allowNull: true },
        action: { type: DataTypes.STRING(40), allowNull: false },
        detail: { type: DataTypes.JSON, allowNull: false },
        createdAt: DataTypes.DATE(3),
        updatedAt: DataTypes.DATE(3),
      },
      { sequelize, tableName: "events", modelName: "farmEvent" },
    );
  }
}
