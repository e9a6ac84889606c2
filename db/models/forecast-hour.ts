import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class ForecastHour extends Model<InferAttributes<ForecastHour>, InferCreationAttributes<ForecastHour>> {
  declare forecastId: number;
  declare stationId: number;
  declare validAt: Date;
  declare pavementTempC: CreationOptional<number | null>;
  declare pavementErrorC: CreationOptional<number | null>;
  declare airTempC: CreationOptional<number | null>;
  declare dewPointC: CreationOptional<number | null>;
  declare windSpeedMPerS: CreationOptional<number | null>;
  declare precipitationMm: CreationOptional<number | null>;
  declare precipitationType: CreationOptional<string | null>;
}

export function initForecastHour(sequelize: Sequelize): typeof ForecastHour {
  return ForecastHour.init(
    {
      forecastId: { type: DataTypes.INTEGER, primaryKey: true },
      stationId: { type: DataTypes.INTEGER, primaryKey: true },
      validAt: { type: DataTypes.DATE, primaryKey: true },
      pavementTempC: { type: DataTypes.DOUBLE },
      pavementErrorC: { type: DataTypes.DOUBLE },
      airTempC: { type: DataTypes.DOUBLE },
      dewPointC: { type: DataTypes.DOUBLE },
      windSpeedMPerS: { type: DataTypes.DOUBLE },
      precipitationMm: { type: DataTypes.DOUBLE },
      precipitationType: { type: DataTypes.TEXT },
    },
    { sequelize, tableName: 'forecast_hours', timestamps: false },
  );
}
