import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

export type EmailTokenPurpose = 'confirm' | 'reset';

/** What a link in a letter allows, once; the link itself is never stored, only its hash. */
export class EmailToken extends Model<
  InferAttributes<EmailToken>,
  InferCreationAttributes<EmailToken>
> {
  declare id: CreationOptional<string>;
  declare userId: string;
  declare purpose: EmailTokenPurpose;
  declare tokenHash: string;
  /** The address the letter went to: what confirming it confirms. */
  declare email: string;
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;
}

export function init(sequelize: Sequelize): void {
  EmailToken.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      userId: { type: DataTypes.UUID, allowNull: false },
      purpose: { type: DataTypes.TEXT, allowNull: false },
      tokenHash: { type: DataTypes.TEXT, allowNull: false },
      email: { type: DataTypes.TEXT, allowNull: false },
      expiresAt: { type: DataTypes.DATE, allowNull: false },
      usedAt: DataTypes.DATE,
      createdAt: DataTypes.DATE,
    },
    { sequelize, tableName: 'email_tokens', underscored: true, updatedAt: false },
  );
}
