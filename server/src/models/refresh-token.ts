import { DataTypes } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';

/** A refresh token by its hash: each is good for one use, and used ones are kept to notice a second. */
export interface RefreshTokenRow extends Model<
  InferAttributes<RefreshTokenRow>,
  InferCreationAttributes<RefreshTokenRow>
> {
  tokenHash: string;
  sessionId: number;
  usedAt: CreationOptional<Date | null>;
}

export function defineRefreshToken(sequelize: Sequelize) {
  return sequelize.define<RefreshTokenRow>(
    'refreshToken',
    {
      tokenHash: { type: DataTypes.CHAR(64), primaryKey: true },
      sessionId: { type: DataTypes.INTEGER, allowNull: false },
      usedAt: { type: DataTypes.DATE(3), allowNull: true },
    },
    { tableName: 'refresh_tokens', underscored: true, timestamps: false },
  );
}
