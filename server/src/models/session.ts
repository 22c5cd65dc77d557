import { DataTypes } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';

/** One signed-in device; all its refresh tokens fall with it. */
export interface SessionRow extends Model<InferAttributes<SessionRow>, InferCreationAttributes<SessionRow>> {
  id: CreationOptional<number>;
  personId: number;
  workshopId: number;
  createdAt: CreationOptional<Date>;
  expiresAt: Date;
  endedAt: CreationOptional<Date | null>;
  endedBecause: CreationOptional<'signed-out' | 'password-changed' | 'token-reused' | null>;
}

export function defineSession(sequelize: Sequelize) {
  return sequelize.define<SessionRow>(
    'session',
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      personId: { type: DataTypes.INTEGER, allowNull: false },
      workshopId: { type: DataTypes.INTEGER, allowNull: false },
      createdAt: { type: DataTypes.DATE(3), allowNull: false, defaultValue: DataTypes.NOW },
      expiresAt: { type: DataTypes.DATE(3), allowNull: false },
      endedAt: { type: DataTypes.DATE(3), allowNull: true },
      endedBecause: { type: DataTypes.STRING(20), allowNull: true },
    },
    { tableName: 'sessions', underscored: true, timestamps: false },
  );
}
