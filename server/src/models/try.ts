import { DataTypes } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';

/** Counted tries (of signing in, of signing up), so that all processes of one database count together. */
export interface TryRow extends Model<InferAttributes<TryRow>, InferCreationAttributes<TryRow>> {
  keyHash: string;
  count: number;
  resetsAt: Date;
}

export function defineTry(sequelize: Sequelize) {
  return sequelize.define<TryRow>(
    'try',
    {
      keyHash: { type: DataTypes.CHAR(64), primaryKey: true },
      count: { type: DataTypes.INTEGER, allowNull: false },
      resetsAt: { type: DataTypes.DATE(3), allowNull: false },
    },
    { tableName: 'tries', underscored: true, timestamps: false },
  );
}
