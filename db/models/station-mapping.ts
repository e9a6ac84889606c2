import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from 'sequelize';

export class StationMapping extends Model<InferAttributes<StationMapping>, InferCreationAttributes<StationMapping>> {
  declare stationId: number;
  declare mapping: unknown;
  declare updatedAt: Date;
  declare updatedBy: number;
}

export function initStationMapping(sequelize: Sequelize): typeof StationMapping {
  return StationMapping.init(
    {
      stationId: { type: DataTypes.INTEGER, primaryKey: true },
      mapping: { type: DataTypes.JSONB, allowNull: false },
      updatedAt: { type: DataTypes.DATE, allowNull: false },
      updatedBy: { type: DataTypes.INTEGER, allowNull: false },
    },
    { sequelize, tableName: 'station_mappings', timestamps: false },
  );
}
