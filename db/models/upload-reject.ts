import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from 'sequelize';

export class UploadReject extends Model<InferAttributes<UploadReject>, InferCreationAttributes<UploadReject>> {
  declare uploadId: number;
  declare line: number;
  declare columnName: string;
  declare reason: string;
  declare raw: string;
}

export function initUploadReject(sequelize: Sequelize): typeof UploadReject {
  return UploadReject.init(
    {
      uploadId: { type: DataTypes.INTEGER, primaryKey: true },
      line: { type: DataTypes.INTEGER, primaryKey: true },
      columnName: { type: DataTypes.TEXT, primaryKey: true },
      reason: { type: DataTypes.TEXT, allowNull: false },
      raw: { type: DataTypes.TEXT, allowNull: false },
    },
    { sequelize, tableName: 'upload_rejects', timestamps: false },
  );
}
