import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Plan extends Model<InferAttributes<Plan>, InferCreationAttributes<Plan>> {
  declare id: CreationOptional<number>;
  declare stormId: number;
  declare passNumber: number;
  declare version: number;
  declare forecastId: CreationOptional<number | null>;
  declare policyVersion: number;
  declare workedOutAt: Date;
  declare workedOutBy: number;
  declare publishedAt: CreationOptional<Date | null>;
  declare publishedBy: CreationOptional<number | null>;
  declare inputs: unknown;
  declare summary: unknown;
}

export function initPlan(sequelize: Sequelize): typeof Plan {
  return Plan.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      stormId: { type: DataTypes.INTEGER, allowNull: false },
      passNumber: { type: DataTypes.INTEGER, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false },
      forecastId: { type: DataTypes.INTEGER },
      policyVersion: { type: DataTypes.INTEGER, allowNull: false },
      workedOutAt: { type: DataTypes.DATE, allowNull: false },
      workedOutBy: { type: DataTypes.INTEGER, allowNull: false },
      publishedAt: { type: DataTypes.DATE },
      publishedBy: { type: DataTypes.INTEGER },
      inputs: { type: DataTypes.JSONB, allowNull: false },
      summary: { type: DataTypes.JSONB, allowNull: false },
    },
    { sequelize, tableName: 'plans', timestamps: false },
  );
}
