import { DataTypes } from 'sequelize';

/** Column definitions that every table uses alike; measured values are DOUBLE, counted INTEGER. */
export const idColumn = {
  type: DataTypes.UUID,
  primaryKey: true,
  defaultValue: DataTypes.UUIDV4,
} as const;
export const uuidColumn = { type: DataTypes.UUID, allowNull: false } as const;
export const textColumn = { type: DataTypes.TEXT, allowNull: false } as const;
export const countedColumn = { type: DataTypes.INTEGER, allowNull: false } as const;
export const measuredColumn = { type: DataTypes.DOUBLE, allowNull: false } as const;
export const jsonColumn = { type: DataTypes.JSON, allowNull: false } as const;

/** Of rows that a person edits. */
export const editedColumns = {
  version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
  createdAt: DataTypes.DATE,
  updatedAt: DataTypes.DATE,
} as const;
