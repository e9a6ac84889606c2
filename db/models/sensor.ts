import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Sensor extends Model<InferAttributes<Sensor>, InferCreationAttributes<Sensor>> {
  declare id: CreationOptional<number>;
  declare stationId: number;
  declare quantity: string;
  declare depthM: CreationOptional<number | null>;
  declare installedOn: CreationOptional<string | null>;
  declare note: CreationOptional<string>;
}

export function initSensor(sequelize: Sequelize): typeof Sensor {
  return Sensor.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      stationId: { type: DataTypes.INTEGER, allowNull: false },
      quantity: { type: DataTypes.TEXT, allowNull: false },
      depthM: { type: DataTypes.DOUBLE },
      installedOn: { type: DataTypes.DATEONLY },
      note: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    },
    { sequelize, tableName: 'sensors', timestamps: false },
  );
}
