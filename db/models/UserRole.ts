import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Role } from '../../src/schemas/roles';

export class UserRole extends Model<InferAttributes<UserRole>, InferCreationAttributes<UserRole>> {
  declare userId: string;
  declare role: Role;
}

export function init(sequelize: Sequelize): void {
  UserRole.init(
    {
      userId: { type: DataTypes.UUID, primaryKey: true },
      role: { type: DataTypes.TEXT, primaryKey: true },
    },
    { sequelize, tableName: 'user_roles', underscored: true, timestamps: false },
  );
}
