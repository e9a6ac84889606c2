import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from 'sequelize';

export class RouteSegment extends Model<InferAttributes<RouteSegment>, InferCreationAttributes<RouteSegment>> {
  declare routeId: number;
  declare position: number;
  declare segmentId: number;
}

export function initRouteSegment(sequelize: Sequelize): typeof RouteSegment {
  return RouteSegment.init(
    {
      routeId: { type: DataTypes.INTEGER, primaryKey: true },
      position: { type: DataTypes.INTEGER, primaryKey: true },
      segmentId: { type: DataTypes.INTEGER, allowNull: false },
    },
    { sequelize, tableName: 'route_segments', timestamps: false },
  );
}
