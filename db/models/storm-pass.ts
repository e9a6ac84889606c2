import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from 'sequelize';

export class StormPass extends Model<InferAttributes<StormPass>, InferCreationAttributes<StormPass>> {
  declare stormId: number;
  declare number: number;
  declare startsAt: Date;
}

export function initStormPass(sequelize: Sequelize): typeof StormPass {
  return StormPass.init(
    {
      stormId: { type: DataTypes.INTEGER, primaryKey: true },
      number: { type: DataTypes.INTEGER, primaryKey: true },
      startsAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'storm_passes', timestamps: false },
  );
}
