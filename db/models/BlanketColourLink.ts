import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import { uuidColumn } from './columns';

/** The colourway of the stash that serves a colour of a blanket; null when none may. */
export class BlanketColourLink extends Model<
  InferAttributes<BlanketColourLink>,
  InferCreationAttributes<BlanketColourLink>
> {
  declare blanketId: string;
  declare colourKey: string;
  declare ownerId: string;
  declare colourwayId: string | null;
}

export function init(sequelize: Sequelize): void {
  BlanketColourLink.init(
    {
      blanketId: { type: DataTypes.UUID, primaryKey: true },
      colourKey: { type: DataTypes.TEXT, primaryKey: true },
      ownerId: uuidColumn(),
      colourwayId: DataTypes.UUID,
    },
    { sequelize, tableName: 'blanket_colour_links', underscored: true, timestamps: false },
  );
}
