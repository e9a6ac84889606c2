import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Storm extends Model<InferAttributes<Storm>, InferCreationAttributes<Storm>> {
  declare id: CreationOptional<number>;
  declare number: number;
  declare name: string;
  declare fromAt: Date;
  declare untilAt: Date;
  declare openedAt: Date;
  declare openedBy: number;
  declare closedAt: CreationOptional<Date | null>;
  declare closedBy: CreationOptional<number | null>;
}

export function initStorm(sequelize: Sequelize): typeof Storm {
  return Storm.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      number: { type: DataTypes.INTEGER, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      fromAt: { type: DataTypes.DATE, allowNull: false },
      untilAt: { type: DataTypes.DATE, allowNull: false },
      openedAt: { type: DataTypes.DATE, allowNull: false },
      openedBy: { type: DataTypes.INTEGER, allowNull: false },
      closedAt: { type: DataTypes.DATE },
      closedBy: { type: DataTypes.INTEGER },
    },
    { sequelize, tableName: 'storms', timestamps: false },
  );
}
