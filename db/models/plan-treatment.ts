import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class PlanTreatment extends Model<InferAttributes<PlanTreatment>, InferCreationAttributes<PlanTreatment>> {
  declare planId: number;
  declare segmentId: number;
  declare action: 'nothing' | 'plough' | 'anti-ice' | 'pre-wet' | 'solid' | 'abrasives' | 'undecided';
  declare materialId: CreationOptional<number | null>;
  declare rateGPerM2: CreationOptional<number | null>;
  declare rateMlPerM2: CreationOptional<number | null>;
  declare holdMin: CreationOptional<number | null>;
  declare reason: string;
  declare why: unknown;
  declare options: unknown;
}

export function initPlanTreatment(sequelize: Sequelize): typeof PlanTreatment {
  return PlanTreatment.init(
    {
      planId: { type: DataTypes.INTEGER, primaryKey: true },
      segmentId: { type: DataTypes.INTEGER, primaryKey: true },
      action: { type: DataTypes.TEXT, allowNull: false },
      materialId: { type: DataTypes.INTEGER },
      rateGPerM2: { type: DataTypes.DOUBLE },
      rateMlPerM2: { type: DataTypes.DOUBLE },
      holdMin: { type: DataTypes.DOUBLE },
      reason: { type: DataTypes.TEXT, allowNull: false },
      why: { type: DataTypes.JSONB, allowNull: false },
      options: { type: DataTypes.JSONB, allowNull: false },
    },
    { sequelize, tableName: 'plan_treatments', timestamps: false },
  );
}
