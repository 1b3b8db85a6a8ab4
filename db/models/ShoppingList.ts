import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { BlanketShopping, ShoppingLine } from '../../src/schemas/shoppingList';
import {
  editedColumns,
  idColumn,
  jsonColumn,
  measuredColumn,
  textColumn,
  uuidColumn,
} from './columns';

/** What was to be bought for a blanket on the day the list was kept, and what has been bought. */
export class ShoppingList extends Model<
  InferAttributes<ShoppingList>,
  InferCreationAttributes<ShoppingList>
> {
  declare id: CreationOptional<string>;
  declare ownerId: string;
  declare blanketId: string | null;
  declare title: string;
  declare yarnName: string;
  declare currency: string | null;
  declare confidence: BlanketShopping['confidence'];
  declare lines: ShoppingLine[];
  /** Colour keys of the lines that have been bought. */
  declare bought: string[];
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function init(sequelize: Sequelize): void {
  ShoppingList.init(
    {
      id: idColumn(),
      ownerId: uuidColumn(),
      blanketId: DataTypes.UUID,
      title: textColumn(),
      yarnName: textColumn(),
      currency: DataTypes.TEXT,
      confidence: measuredColumn(),
      lines: jsonColumn(),
      bought: jsonColumn(),
      ...editedColumns(),
    },
    { sequelize, tableName: 'shopping_lists', underscored: true },
  );
}
