import { DataTypes } from 'sequelize';

/**
 * Column definitions that every table uses alike; measured values are DOUBLE, counted INTEGER.
 * Functions, because Sequelize writes each column's name into the object it is given.
 */
export const idColumn = () => ({
  type: DataTypes.UUID,
  primaryKey: true,
  defaultValue: DataTypes.UUIDV4,
});
export const uuidColumn = () => ({ type: DataTypes.UUID, allowNull: false });
export const textColumn = () => ({ type: DataTypes.TEXT, allowNull: false });
export const countedColumn = () => ({ type: DataTypes.INTEGER, allowNull: false });
export const measuredColumn = () => ({ type: DataTypes.DOUBLE, allowNull: false });
export const jsonColumn = () => ({ type: DataTypes.JSON, allowNull: false });

/** Of rows that a person edits. */
export const editedColumns = () => ({
  version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
  createdAt: DataTypes.DATE,
  updatedAt: DataTypes.DATE,
});
