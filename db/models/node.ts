import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

/** `position` (PostGIS) is written and read in SQL, beside the queries that need it. */
export class Node extends Model<InferAttributes<Node>, InferCreationAttributes<Node>> {
  declare id: CreationOptional<number>;
  declare sourceKey: string;
}

export function initNode(sequelize: Sequelize): typeof Node {
  return Node.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      sourceKey: { type: DataTypes.TEXT, allowNull: false },
    },
    { sequelize, tableName: 'nodes', timestamps: false },
  );
}
