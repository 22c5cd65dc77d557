import { DataTypes } from 'sequelize';
import type { InferAttributes, InferCreationAttributes, Model, NonAttribute, Sequelize } from 'sequelize';
import type { DesignRow } from './design.ts';

/** What the engine said of a stored draft: of which version, by which engine, from which document. */
export interface PredictionRow extends Model<
  InferAttributes<PredictionRow>,
  InferCreationAttributes<PredictionRow>
> {
  designId: number;
  workshopId: number;
  draftVersion: number;
  engine: string;
  /** SHA-256 of the document's canonical JSON, hex. */
  documentHash: string;
  /** JSON of `designPredictionSchema`. */
  prediction: string;
  /** JSON of `designSensitivitiesSchema`; null until someone asks for them. */
  sensitivities: string | null;
  computedAt: Date;
  design?: NonAttribute<DesignRow>;
}

export function definePrediction(sequelize: Sequelize) {
  return sequelize.define<PredictionRow>(
    'prediction',
    {
      designId: { type: DataTypes.INTEGER, primaryKey: true },
      workshopId: { type: DataTypes.INTEGER, allowNull: false },
      draftVersion: { type: DataTypes.INTEGER, allowNull: false },
      engine: { type: DataTypes.STRING(60), allowNull: false },
      documentHash: { type: DataTypes.CHAR(64), allowNull: false },
      prediction: { type: DataTypes.TEXT('long'), allowNull: false },
      sensitivities: { type: DataTypes.TEXT('long'), allowNull: true },
      computedAt: { type: DataTypes.DATE(3), allowNull: false },
    },
    { tableName: 'predictions', underscored: true, timestamps: false },
  );
}
