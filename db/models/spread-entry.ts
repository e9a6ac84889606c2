import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class SpreadEntry extends Model<InferAttributes<SpreadEntry>, InferCreationAttributes<SpreadEntry>> {
  declare id: string;
  declare runId: string;
  declare segmentId: number;
  declare outcome: 'spread' | 'ploughed' | 'skipped';
  declare materialId: CreationOptional<number | null>;
  declare rateGPerM2: CreationOptional<number | null>;
  declare isPloughed: CreationOptional<boolean>;
  declare planId: CreationOptional<number | null>;
  declare recommendedMaterialId: CreationOptional<number | null>;
  declare recommendedRateGPerM2: CreationOptional<number | null>;
  declare areaM2: number;
  declare rateSource: 'as-shown' | 'typed' | 'controller';
  declare note: CreationOptional<string>;
  declare spreadAt: Date;
  declare recordedAt: Date;
  declare recordedBy: number;
  declare amendsId: CreationOptional<string | null>;
}

export function initSpreadEntry(sequelize: Sequelize): typeof SpreadEntry {
  return SpreadEntry.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      runId: { type: DataTypes.UUID, allowNull: false },
      segmentId: { type: DataTypes.INTEGER, allowNull: false },
      outcome: { type: DataTypes.TEXT, allowNull: false },
      materialId: { type: DataTypes.INTEGER },
      rateGPerM2: { type: DataTypes.DOUBLE },
      isPloughed: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
      planId: { type: DataTypes.INTEGER },
      recommendedMaterialId: { type: DataTypes.INTEGER },
      recommendedRateGPerM2: { type: DataTypes.DOUBLE },
      areaM2: { type: DataTypes.DOUBLE, allowNull: false },
      rateSource: { type: DataTypes.TEXT, allowNull: false },
      note: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
      spreadAt: { type: DataTypes.DATE, allowNull: false },
      recordedAt: { type: DataTypes.DATE, allowNull: false },
      recordedBy: { type: DataTypes.INTEGER, allowNull: false },
      amendsId: { type: DataTypes.UUID },
    },
    { sequelize, tableName: 'spread_entries', timestamps: false },
  );
}
