import { DataTypes } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Model,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import type { DesignState } from '#shared/contract/designs.ts';
import type { MouthEndKind } from '#shared/document/design-document.ts';
import type { PersonRow } from './person.ts';

/** An instrument under development, with what the rack shows of its newest state. */
export interface DesignRow extends Model<InferAttributes<DesignRow>, InferCreationAttributes<DesignRow>> {
  id: CreationOptional<number>;
  workshopId: number;
  name: string;
  kind: MouthEndKind;
  lowestNote: string | null;
  /** The lowest note's place on the keyboard, to sort by. */
  lowestMidi: number | null;
  temperament: string;
  a4Hz: number;
  draftVersion: number;
  revisionNumber: CreationOptional<number>;
  state: CreationOptional<DesignState>;
  /** JSON: outline, plumb, furthest1 and furthest2 of `designSummarySchema`. */
  rackView: string;
  createdById: number;
  changedById: number;
  createdAt: CreationOptional<Date>;
  changedAt: Date;
  archivedAt: CreationOptional<Date | null>;
  createdBy?: NonAttribute<PersonRow>;
  changedBy?: NonAttribute<PersonRow>;
}

export function defineDesign(sequelize: Sequelize) {
  return sequelize.define<DesignRow>(
    'design',
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      workshopId: { type: DataTypes.INTEGER, allowNull: false },
      name: { type: DataTypes.STRING(120), allowNull: false },
      kind: { type: DataTypes.STRING(20), allowNull: false },
      lowestNote: { type: DataTypes.STRING(8), allowNull: true },
      lowestMidi: { type: DataTypes.INTEGER, allowNull: true },
      temperament: { type: DataTypes.STRING(40), allowNull: false },
      a4Hz: { type: DataTypes.DOUBLE, allowNull: false, field: 'a4_hz' },
      draftVersion: { type: DataTypes.INTEGER, allowNull: false },
      revisionNumber: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      state: { type: DataTypes.STRING(12), allowNull: false, defaultValue: 'draft' },
      rackView: { type: DataTypes.TEXT('long'), allowNull: false },
      createdById: { type: DataTypes.INTEGER, allowNull: false },
      changedById: { type: DataTypes.INTEGER, allowNull: false },
      createdAt: { type: DataTypes.DATE(3), allowNull: false, defaultValue: DataTypes.NOW },
      changedAt: { type: DataTypes.DATE(3), allowNull: false },
      archivedAt: { type: DataTypes.DATE(3), allowNull: true },
    },
    { tableName: 'designs', underscored: true, timestamps: false },
  );
}
