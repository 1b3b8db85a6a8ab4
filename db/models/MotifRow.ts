import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { MotifInput } from '../../src/schemas/motif';
import {
  countedColumn,
  editedColumns,
  idColumn,
  jsonColumn,
  textColumn,
  uuidColumn,
} from './columns';

/** A motif of one's own. Named a row because `Motif` is the library's. */
export class MotifRow extends Model<InferAttributes<MotifRow>, InferCreationAttributes<MotifRow>> {
  declare id: CreationOptional<string>;
  declare ownerId: string;
  declare name: string;
  declare sides: MotifInput['sides'];
  declare ring: MotifInput['ring'];
  declare rounds: MotifInput['rounds'];
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function init(sequelize: Sequelize): void {
  MotifRow.init(
    {
      id: idColumn(),
      ownerId: uuidColumn(),
      name: textColumn(),
      sides: countedColumn(),
      ring: jsonColumn(),
      rounds: jsonColumn(),
      ...editedColumns(),
    },
    { sequelize, tableName: 'motifs', underscored: true },
  );
}
