import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Run extends Model<InferAttributes<Run>, InferCreationAttributes<Run>> {
  declare id: string;
  declare stormId: CreationOptional<number | null>;
  declare planId: CreationOptional<number | null>;
  declare routeId: CreationOptional<number | null>;
  declare truckId: number;
  declare driverId: number;
  declare startedAt: Date;
  declare finishedAt: CreationOptional<Date | null>;
  declare recordedAt: Date;
}

export function initRun(sequelize: Sequelize): typeof Run {
  return Run.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      stormId: { type: DataTypes.INTEGER },
      planId: { type: DataTypes.INTEGER },
      routeId: { type: DataTypes.INTEGER },
      truckId: { type: DataTypes.INTEGER, allowNull: false },
      driverId: { type: DataTypes.INTEGER, allowNull: false },
      startedAt: { type: DataTypes.DATE, allowNull: false },
      finishedAt: { type: DataTypes.DATE },
      recordedAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'runs', timestamps: false },
  );
}
