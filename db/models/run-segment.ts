import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from 'sequelize';

export class RunSegment extends Model<InferAttributes<RunSegment>, InferCreationAttributes<RunSegment>> {
  declare runId: string;
  declare position: number;
  declare segmentId: number;
}

export function initRunSegment(sequelize: Sequelize): typeof RunSegment {
  return RunSegment.init(
    {
      runId: { type: DataTypes.UUID, primaryKey: true },
      position: { type: DataTypes.INTEGER, primaryKey: true },
      segmentId: { type: DataTypes.INTEGER, allowNull: false },
    },
    { sequelize, tableName: 'run_segments', timestamps: false },
  );
}
