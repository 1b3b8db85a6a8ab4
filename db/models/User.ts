import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { Preferences } from '../../src/schemas/preferences';
import type { UserRole } from './UserRole';

export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: CreationOptional<string>;
  declare name: string;
  /** Trimmed and in lower case; the database keeps it unique without regard to case. */
  declare email: string;
  declare pendingEmail: CreationOptional<string | null>;
  declare passwordHash: string;
  declare emailConfirmedAt: CreationOptional<Date | null>;
  /** Sessions carry the version they began with; raising it ends them all. */
  declare tokenVersion: CreationOptional<number>;
  declare units: CreationOptional<Preferences['units']>;
  declare terms: CreationOptional<Preferences['terms']>;
  declare theme: CreationOptional<Preferences['theme']>;
  declare currency: CreationOptional<Preferences['currency']>;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
  declare roleRows?: NonAttribute<UserRole[]>;
}

export function init(sequelize: Sequelize): void {
  User.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      name: { type: DataTypes.TEXT, allowNull: false },
      email: { type: DataTypes.TEXT, allowNull: false },
      pendingEmail: DataTypes.TEXT,
      passwordHash: { type: DataTypes.TEXT, allowNull: false },
      emailConfirmedAt: DataTypes.DATE,
      tokenVersion: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      units: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'metric' },
      terms: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'us' },
      theme: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'system' },
      currency: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'EUR' },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      createdAt: DataTypes.DATE,
      updatedAt: DataTypes.DATE,
    },
    { sequelize, tableName: 'users', underscored: true },
  );
}
