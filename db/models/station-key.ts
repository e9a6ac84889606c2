import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class StationKey extends Model<InferAttributes<StationKey>, InferCreationAttributes<StationKey>> {
  declare id: CreationOptional<number>;
  declare stationId: number;
  declare keyHash: string;
  declare hint: string;
  declare issuedAt: Date;
  declare issuedBy: number;
  declare revokedAt: CreationOptional<Date | null>;
}

export function initStationKey(sequelize: Sequelize): typeof StationKey {
  return StationKey.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      stationId: { type: DataTypes.INTEGER, allowNull: false },
      keyHash: { type: DataTypes.TEXT, allowNull: false },
      hint: { type: DataTypes.TEXT, allowNull: false },
      issuedAt: { type: DataTypes.DATE, allowNull: false },
      issuedBy: { type: DataTypes.INTEGER, allowNull: false },
      revokedAt: { type: DataTypes.DATE },
    },
    { sequelize, tableName: 'station_keys', timestamps: false },
  );
}
