import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** Whether a motif of a blanket is made, and when that was last said. */
export class MakingTick extends Model<
  InferAttributes<MakingTick>,
  InferCreationAttributes<MakingTick>
> {
  declare blanketId: string;
  declare motif: string;
  declare done: boolean;
  declare at: Date;
}

export function init(sequelize: Sequelize): void {
  MakingTick.init(
    {
      blanketId: { type: DataTypes.UUID, primaryKey: true },
      motif: { type: DataTypes.TEXT, primaryKey: true },
      done: { type: DataTypes.BOOLEAN, allowNull: false },
      at: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'making_ticks', underscored: true, timestamps: false },
  );
}
