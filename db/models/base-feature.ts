import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

/** `geometry` (PostGIS) is written and read in SQL, beside the queries that need it. */
export class BaseFeature extends Model<InferAttributes<BaseFeature>, InferCreationAttributes<BaseFeature>> {
  declare id: CreationOptional<number>;
  declare kind: 'coast' | 'river' | 'lake' | 'contour' | 'town' | 'water-name';
  declare name: CreationOptional<string>;
  declare heightM: CreationOptional<number | null>;
}

export function initBaseFeature(sequelize: Sequelize): typeof BaseFeature {
  return BaseFeature.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      kind: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
      heightM: { type: DataTypes.DOUBLE },
    },
    { sequelize, tableName: 'base_features', timestamps: false },
  );
}
