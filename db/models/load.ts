import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from 'sequelize';

export class Load extends Model<InferAttributes<Load>, InferCreationAttributes<Load>> {
  declare id: string;
  declare runId: string;
  declare yardId: number;
  declare materialId: number;
  declare massKg: number;
  declare loadedAt: Date;
  declare recordedAt: Date;
  declare recordedBy: number;
}

export function initLoad(sequelize: Sequelize): typeof Load {
  return Load.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      runId: { type: DataTypes.UUID, allowNull: false },
      yardId: { type: DataTypes.INTEGER, allowNull: false },
      materialId: { type: DataTypes.INTEGER, allowNull: false },
      massKg: { type: DataTypes.DOUBLE, allowNull: false },
      loadedAt: { type: DataTypes.DATE, allowNull: false },
      recordedAt: { type: DataTypes.DATE, allowNull: false },
      recordedBy: { type: DataTypes.INTEGER, allowNull: false },
    },
    { sequelize, tableName: 'loads', timestamps: false },
  );
}
