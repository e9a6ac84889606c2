import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class AuditRecord extends Model<InferAttributes<AuditRecord>, InferCreationAttributes<AuditRecord>> {
  declare id: CreationOptional<number>;
  declare recordedAt: CreationOptional<Date>;
  declare personId: CreationOptional<number | null>;
  declare action: string;
  declare subjectKind: string;
  declare subjectId: string;
  declare detail: CreationOptional<unknown>;
}

export function initAuditRecord(sequelize: Sequelize): typeof AuditRecord {
  return AuditRecord.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      recordedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      personId: { type: DataTypes.INTEGER },
      action: { type: DataTypes.TEXT, allowNull: false },
      subjectKind: { type: DataTypes.TEXT, allowNull: false },
      subjectId: { type: DataTypes.TEXT, allowNull: false },
      detail: { type: DataTypes.JSONB, allowNull: false, defaultValue: {} },
    },
    { sequelize, tableName: 'audit_log', timestamps: false },
  );
}
