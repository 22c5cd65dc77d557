import { DataTypes } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model, NonAttribute, Sequelize } from 'sequelize';
import type { DesignRow } from './design.ts';
import type { PersonRow } from './person.ts';

/** The one state of a design that can be edited; `version` goes up by one with every save. */
export interface DraftRow extends Model<InferAttributes<DraftRow>, InferCreationAttributes<DraftRow>> {
  designId: number;
  workshopId: number;
  version: number;
  /** JSON of the design document, as it was read. */
  document: string;
  savedById: number;
  savedAt: Date;
  savedBy?: NonAttribute<PersonRow>;
  design?: NonAttribute<DesignRow>;
}

export function defineDraft(sequelize: Sequelize) {
  return sequelize.define<DraftRow>(
    'draft',
    {
      designId: { type: DataTypes.INTEGER, primaryKey: true },
      workshopId: { type: DataTypes.INTEGER, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false },
      document: { type: DataTypes.TEXT('long'), allowNull: false },
      savedById: { type: DataTypes.INTEGER, allowNull: false },
      savedAt: { type: DataTypes.DATE(3), allowNull: false },
    },
    { tableName: 'drafts', underscored: true, timestamps: false },
  );
}
