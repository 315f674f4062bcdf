import { DataTypes } from "sequelize";

/** Column shapes that every table shares. */
export const id = { type: DataTypes.UUID, primaryKey: true } as const;

export const moments = {
  created_at: { type: DataTypes.DATE(3), allowNull: false },
  updated_at: { type: DataTypes.DATE(3), allowNull: false },
} as const;

/** A foreign key; rows go with the row they belong to. */
export function reference(table: string, allowNull = false) {
  return {
    type: DataTypes.UUID,
    allowNull,
    references: { model: table, key: "id" },
    onDelete: allowNull ? "SET NULL" : "CASCADE",
    onUpdate: "CASCADE",
  };
}
