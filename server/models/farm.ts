import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

export class Farm extends Model<InferAttributes<Farm>, InferCreationAttributes<Farm>> {
  declare id: CreationOptional<string>;
  declare cooperativeId: string;
  declare name: string;
  declare place: string;
  declare latitudeDeg: number;
  declare longitudeDeg: number;
  declare sharedWithManager: CreationOptional<boolean>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static define(sequelize: Sequelize): void {
    Farm.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        cooperativeId: { type: DataTypes.UUID, allowNull: false },
        name: { type: DataTypes.STRING(80), allowNull: false },
        place: { type: DataTypes.STRING(80), allowNull: false },
        latitudeDeg: { type: DataTypes.DOUBLE, allowNull: false },
        longitudeDeg: { type: DataTypes.DOUBLE, allowNull: false },
        sharedWithManager: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
        createdAt: DataTypes.DATE(3),
        updatedAt: DataTypes.DATE(3),
      },
      { sequelize, tableName: "farms", modelName: "farm" },
    );
  }
}
