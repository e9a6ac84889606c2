import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Truck extends Model<InferAttributes<Truck>, InferCreationAttributes<Truck>> {
  declare id: CreationOptional<number>;
  declare number: number;
  declare name: string;
  declare yardId: number;
  declare ploughWidthM: CreationOptional<number | null>;
  declare isActive: CreationOptional<boolean>;
}

export function initTruck(sequelize: Sequelize): typeof Truck {
  return Truck.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      number: { type: DataTypes.INTEGER, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      yardId: { type: DataTypes.INTEGER, allowNull: false },
      ploughWidthM: { type: DataTypes.DOUBLE },
      isActive: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: true },
    },
    { sequelize, tableName: 'trucks', timestamps: false },
  );
}
