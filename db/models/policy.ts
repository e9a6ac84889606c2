import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Policy extends Model<InferAttributes<Policy>, InferCreationAttributes<Policy>> {
  declare version: number;
  declare rules: unknown;
  declare adoptedAt: Date;
  declare adoptedBy: CreationOptional<number | null>;
}

export function initPolicy(sequelize: Sequelize): typeof Policy {
  return Policy.init(
    {
      version: { type: DataTypes.INTEGER, primaryKey: true },
      rules: { type: DataTypes.JSONB, allowNull: false },
      adoptedAt: { type: DataTypes.DATE, allowNull: false },
      adoptedBy: { type: DataTypes.INTEGER },
    },
    { sequelize, tableName: 'policies', timestamps: false },
  );
}
