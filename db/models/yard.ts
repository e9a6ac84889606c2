import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

/** `position` (PostGIS) is written and read in SQL, beside the queries that need it. */
export class Yard extends Model<InferAttributes<Yard>, InferCreationAttributes<Yard>> {
  declare id: CreationOptional<number>;
  declare name: string;
  declare solidCapacityKg: number;
  declare brineCapacityL: number;
  declare isActive: CreationOptional<boolean>;
}

export function initYard(sequelize: Sequelize): typeof Yard {
  return Yard.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      name: { type: DataTypes.TEXT, allowNull: false },
      solidCapacityKg: { type: DataTypes.DOUBLE, allowNull: false },
      brineCapacityL: { type: DataTypes.DOUBLE, allowNull: false },
      isActive: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: true },
    },
    { sequelize, tableName: 'yards', timestamps: false },
  );
}
