import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Route extends Model<InferAttributes<Route>, InferCreationAttributes<Route>> {
  declare id: CreationOptional<number>;
  declare name: string;
  declare yardId: number;
  declare truckId: CreationOptional<number | null>;
  declare isActive: CreationOptional<boolean>;
}

export function initRoute(sequelize: Sequelize): typeof Route {
  return Route.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      name: { type: DataTypes.TEXT, allowNull: false },
      yardId: { type: DataTypes.INTEGER, allowNull: false },
      truckId: { type: DataTypes.INTEGER },
      isActive: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: true },
    },
    { sequelize, tableName: 'routes', timestamps: false },
  );
}
