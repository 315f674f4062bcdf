import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

export class FarmPerson extends Model<InferAttributes<FarmPerson>, InferCreationAttributes<FarmPerson>> {
  declare id: CreationOptional<string>;
  declare farmId: string;
  declare personId: string;
  declare role: "advisor" | "farmer";
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static define(sequelize: Sequelize): void {
    FarmPerson.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        farmId: { type: DataTypes.UUID, allowNull: false },
        personId: { type: DataTypes.UUID, allowNull: false },
        role: { type: DataTypes.STRING(10), allowNull: false },
        createdAt: DataTypes.DATE(3),
        updatedAt: DataTypes.DATE(3),
      },
      { sequelize, tableName: "farm_people", modelName: "farmPerson" },
    );
  }
}
