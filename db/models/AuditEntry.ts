import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

export type AuditAction = 'roles-set' | 'first-administrator';

/** Who changed whose account, and from what to what. Written once, never changed. */
export class AuditEntry extends Model<
  InferAttributes<AuditEntry>,
  InferCreationAttributes<AuditEntry>
> {
  declare id: CreationOptional<string>;
  declare action: AuditAction;
  declare actorId: string | null;
  declare actorName: string;
  declare subjectId: string | null;
  declare subjectName: string;
  declare before: readonly string[];
  declare after: readonly string[];
  declare createdAt: CreationOptional<Date>;
}

export function init(sequelize: Sequelize): void {
  AuditEntry.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      action: { type: DataTypes.TEXT, allowNull: false },
      actorId: DataTypes.UUID,
      actorName: { type: DataTypes.TEXT, allowNull: false },
      subjectId: DataTypes.UUID,
      subjectName: { type: DataTypes.TEXT, allowNull: false },
      before: { type: DataTypes.ARRAY(DataTypes.TEXT), allowNull: false },
      after: { type: DataTypes.ARRAY(DataTypes.TEXT), allowNull: false },
      createdAt: DataTypes.DATE,
    },
    { sequelize, tableName: 'audit_entries', underscored: true, updatedAt: false },
  );
}
