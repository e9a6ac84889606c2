import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Reading extends Model<InferAttributes<Reading>, InferCreationAttributes<Reading>> {
  declare stationId: number;
  declare observedAt: Date;
  declare pavementTempC: CreationOptional<number | null>;
  declare airTempC: CreationOptional<number | null>;
  declare dewPointC: CreationOptional<number | null>;
  declare relativeHumidity: CreationOptional<number | null>;
  declare windSpeedMPerS: CreationOptional<number | null>;
  declare windGustMPerS: CreationOptional<number | null>;
  declare windDirectionDeg: CreationOptional<number | null>;
  declare precipitationMm: CreationOptional<number | null>;
  declare precipitationType: CreationOptional<string | null>;
  declare subsurfaceTempC: CreationOptional<number | null>;
  declare freezingPointC: CreationOptional<number | null>;
  declare solarWPerM2: CreationOptional<number | null>;
  declare visibilityM: CreationOptional<number | null>;
  declare waterMm: CreationOptional<number | null>;
  declare surfaceStatus: CreationOptional<string | null>;
  declare flags: CreationOptional<unknown>;
  declare uploadId: CreationOptional<number | null>;
}

export function initReading(sequelize: Sequelize): typeof Reading {
  return Reading.init(
    {
      stationId: { type: DataTypes.INTEGER, primaryKey: true },
      observedAt: { type: DataTypes.DATE, primaryKey: true },
      pavementTempC: { type: DataTypes.DOUBLE },
      airTempC: { type: DataTypes.DOUBLE },
      dewPointC: { type: DataTypes.DOUBLE },
      relativeHumidity: { type: DataTypes.DOUBLE },
      windSpeedMPerS: { type: DataTypes.DOUBLE },
      windGustMPerS: { type: DataTypes.DOUBLE },
      windDirectionDeg: { type: DataTypes.DOUBLE },
      precipitationMm: { type: DataTypes.DOUBLE },
      precipitationType: { type: DataTypes.TEXT },
      subsurfaceTempC: { type: DataTypes.DOUBLE },
      freezingPointC: { type: DataTypes.DOUBLE },
      solarWPerM2: { type: DataTypes.DOUBLE },
      visibilityM: { type: DataTypes.DOUBLE },
      waterMm: { type: DataTypes.DOUBLE },
      surfaceStatus: { type: DataTypes.TEXT },
      flags: { type: DataTypes.JSONB },
      uploadId: { type: DataTypes.INTEGER },
    },
    { sequelize, tableName: 'readings', timestamps: false },
  );
}
