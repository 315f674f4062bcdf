import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

export class Cooperative extends Model<InferAttributes<Cooperative>, InferCreationAttributes<Cooperative>> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare country: string;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static define(sequelize: Sequelize): void {
    Cooperative.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        name: { type: DataTypes.STRING(80), allowNull: false },
        country: { type: DataTypes.CHAR(2), allowNull: false },
        createdAt: DataTypes.DATE(3),
        updatedAt: DataTypes.DATE(3),
      },
      { sequelize, tableName: "cooperatives", modelName: "cooperative" },
    );
  }
}
