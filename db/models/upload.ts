import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Upload extends Model<InferAttributes<Upload>, InferCreationAttributes<Upload>> {
  declare id: CreationOptional<number>;
  declare stationId: number;
  declare fileName: string;
  declare sha256: string;
  declare bytes: number;
  declare mapping: unknown;
  declare source: 'screen' | 'script';
  declare uploadedBy: CreationOptional<number | null>;
  declare stationKeyId: CreationOptional<number | null>;
  declare startedAt: Date;
  declare finishedAt: Date;
  declare rowsRead: number;
  declare rowsAdded: number;
  declare rowsFilled: number;
  declare rowsUnchanged: number;
  declare rowsRejected: number;
  declare rowsFlagged: number;
  declare rowsEmpty: CreationOptional<number>;
}

export function initUpload(sequelize: Sequelize): typeof Upload {
  return Upload.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      stationId: { type: DataTypes.INTEGER, allowNull: false },
      fileName: { type: DataTypes.TEXT, allowNull: false },
      sha256: { type: DataTypes.TEXT, allowNull: false },
      bytes: { type: DataTypes.DOUBLE, allowNull: false },
      mapping: { type: DataTypes.JSONB, allowNull: false },
      source: { type: DataTypes.TEXT, allowNull: false },
      uploadedBy: { type: DataTypes.INTEGER },
      stationKeyId: { type: DataTypes.INTEGER },
      startedAt: { type: DataTypes.DATE, allowNull: false },
      finishedAt: { type: DataTypes.DATE, allowNull: false },
      rowsRead: { type: DataTypes.INTEGER, allowNull: false },
      rowsAdded: { type: DataTypes.INTEGER, allowNull: false },
      rowsFilled: { type: DataTypes.INTEGER, allowNull: false },
      rowsUnchanged: { type: DataTypes.INTEGER, allowNull: false },
      rowsRejected: { type: DataTypes.INTEGER, allowNull: false },
      rowsFlagged: { type: DataTypes.INTEGER, allowNull: false },
      rowsEmpty: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    },
    { sequelize, tableName: 'uploads', timestamps: false },
  );
}
