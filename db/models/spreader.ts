import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Spreader extends Model<InferAttributes<Spreader>, InferCreationAttributes<Spreader>> {
  declare id: CreationOptional<number>;
  declare truckId: number;
  declare name: string;
  declare hopperKg: number;
  declare tankL: number;
  declare minRateGPerM2: number;
  declare maxRateGPerM2: number;
  declare maxLiquidRateMlPerM2: CreationOptional<number | null>;
  declare calibratedOn: CreationOptional<string | null>;
}

export function initSpreader(sequelize: Sequelize): typeof Spreader {
  return Spreader.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      truckId: { type: DataTypes.INTEGER, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      hopperKg: { type: DataTypes.DOUBLE, allowNull: false },
      tankL: { type: DataTypes.DOUBLE, allowNull: false },
      minRateGPerM2: { type: DataTypes.DOUBLE, allowNull: false },
      maxRateGPerM2: { type: DataTypes.DOUBLE, allowNull: false },
      maxLiquidRateMlPerM2: { type: DataTypes.DOUBLE },
      calibratedOn: { type: DataTypes.DATEONLY },
    },
    { sequelize, tableName: 'spreaders', timestamps: false },
  );
}
