import { DataTypes } from 'sequelize';
import type { CreationOptional, InferAttributes, InferCreationAttributes, Model, Sequelize } from 'sequelize';

export interface WorkshopRow extends Model<
  InferAttributes<WorkshopRow>,
  InferCreationAttributes<WorkshopRow>
> {
  id: CreationOptional<number>;
  name: string;
  unit: 'mm' | 'inch';
  a4Hz: number;
  temperatureC: number;
  band1Cents: CreationOptional<number>;
  band2Cents: CreationOptional<number>;
  band3Cents: CreationOptional<number>;
  referenceEnd: CreationOptional<'foot' | 'mouth'>;
  createdAt: CreationOptional<Date>;
}

export function defineWorkshop(sequelize: Sequelize) {
  return sequelize.define<WorkshopRow>(
    'workshop',
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      name: { type: DataTypes.STRING(100), allowNull: false },
      unit: { type: DataTypes.STRING(4), allowNull: false },
      a4Hz: { type: DataTypes.DOUBLE, allowNull: false, field: 'a4_hz' },
      temperatureC: { type: DataTypes.DOUBLE, allowNull: false, field: 'temperature_c' },
      band1Cents: { type: DataTypes.DOUBLE, allowNull: false, defaultValue: 5, field: 'band1_cents' },
      band2Cents: { type: DataTypes.DOUBLE, allowNull: false, defaultValue: 8, field: 'band2_cents' },
      band3Cents: { type: DataTypes.DOUBLE, allowNull: false, defaultValue: 15, field: 'band3_cents' },
      referenceEnd: { type: DataTypes.STRING(5), allowNull: false, defaultValue: 'foot' },
      createdAt: { type: DataTypes.DATE(3), allowNull: false, defaultValue: DataTypes.NOW },
    },
    { tableName: 'workshops', underscored: true, timestamps: false },
  );
}
