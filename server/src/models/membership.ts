import { DataTypes } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Model,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import type { Role } from '#shared/contract/session.ts';
import type { PersonRow } from './person.ts';
import type { WorkshopRow } from './workshop.ts';

/** One person in one workshop, with the one role they have there. */
export interface MembershipRow extends Model<
  InferAttributes<MembershipRow>,
  InferCreationAttributes<MembershipRow>
> {
  id: CreationOptional<number>;
  workshopId: number;
  personId: number;
  role: Role;
  lastHereAt: CreationOptional<Date | null>;
  person?: NonAttribute<PersonRow>;
  workshop?: NonAttribute<WorkshopRow>;
}

export function defineMembership(sequelize: Sequelize) {
  return sequelize.define<MembershipRow>(
    'membership',
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      workshopId: { type: DataTypes.INTEGER, allowNull: false },
      personId: { type: DataTypes.INTEGER, allowNull: false },
      role: { type: DataTypes.STRING(12), allowNull: false },
      lastHereAt: { type: DataTypes.DATE(3), allowNull: true },
    },
    { tableName: 'memberships', underscored: true, timestamps: false },
  );
}
