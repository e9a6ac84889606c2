import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Forecast extends Model<InferAttributes<Forecast>, InferCreationAttributes<Forecast>> {
  declare id: CreationOptional<number>;
  declare source: string;
  declare issuedAt: Date;
  declare receivedAt: Date;
}

export function initForecast(sequelize: Sequelize): typeof Forecast {
  return Forecast.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      source: { type: DataTypes.TEXT, allowNull: false },
      issuedAt: { type: DataTypes.DATE, allowNull: false },
      receivedAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'forecasts', timestamps: false },
  );
}
