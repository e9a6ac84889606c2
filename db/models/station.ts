import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

/** `position` (PostGIS) is written and read in SQL, beside the queries that need it. */
export class Station extends Model<InferAttributes<Station>, InferCreationAttributes<Station>> {
  declare id: CreationOptional<number>;
  declare name: string;
  declare heightM: CreationOptional<number>;
  declare zone: string;
  declare isActive: CreationOptional<boolean>;
}

export function initStation(sequelize: Sequelize): typeof Station {
  return Station.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      name: { type: DataTypes.TEXT, allowNull: false },
      heightM: { type: DataTypes.DOUBLE, allowNull: false, defaultValue: 0 },
      zone: { type: DataTypes.TEXT, allowNull: false },
      isActive: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: true },
    },
    { sequelize, tableName: 'stations', timestamps: false },
  );
}
