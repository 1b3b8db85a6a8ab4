import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Motif } from '../../src/lib/motifs/motif';
import type { MotifInput } from '../../src/schemas/motif';
import { editedColumns, idColumn, uuidColumn } from './columns';
import { patternColumns } from './patternColumns';

/** A motif of one's own, as last saved. Named a row because `Motif` is the library's. */
export class MotifRow extends Model<InferAttributes<MotifRow>, InferCreationAttributes<MotifRow>> {
  declare id: CreationOptional<string>;
  declare ownerId: string;
  declare name: string;
  declare text: string;
  declare terms: MotifInput['terms'];
  declare sides: MotifInput['sides'];
  declare size: number;
  declare stitches: MotifInput['stitches'];
  /** What the reader made of the text: no rounds where it made none that a blanket could use. */
  declare ring: Motif['ring'];
  declare rounds: Motif['rounds'];
  declare errors: number;
  declare warnings: number;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function init(sequelize: Sequelize): void {
  MotifRow.init(
    { id: idColumn(), ownerId: uuidColumn(), ...patternColumns(), ...editedColumns() },
    { sequelize, tableName: 'motifs', underscored: true },
  );
}
