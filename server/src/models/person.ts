import { DataTypes } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';

/** Someone who can sign in; belongs to workshops through memberships. */
export interface PersonRow extends Model<InferAttributes<PersonRow>, InferCreationAttributes<PersonRow>> {
  id: CreationOptional<number>;
  name: string;
  /** In lower case, unique over all workshops. */
  email: string;
  passwordHash: string;
  createdAt: CreationOptional<Date>;
}

export function definePerson(sequelize: Sequelize) {
  return sequelize.define<PersonRow>(
    'person',
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      name: { type: DataTypes.STRING(100), allowNull: false },
      email: { type: DataTypes.STRING(200), allowNull: false },
      passwordHash: { type: DataTypes.STRING(100), allowNull: false },
      createdAt: { type: DataTypes.DATE(3), allowNull: false, defaultValue: DataTypes.NOW },
    },
    { tableName: 'people', underscored: true, timestamps: false },
  );
}
