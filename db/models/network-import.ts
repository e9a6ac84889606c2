import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class NetworkImport extends Model<InferAttributes<NetworkImport>, InferCreationAttributes<NetworkImport>> {
  declare id: CreationOptional<number>;
  declare state: 'previewed' | 'applied' | 'undone' | 'discarded';
  declare fileName: string;
  declare sha256: string;
  /** Files under one name replace each other. */
  declare source: CreationOptional<string>;
  declare attribution: CreationOptional<string>;
  declare classMapping: unknown;
  declare report: unknown;
  declare payload: unknown;
  declare beforeImage: CreationOptional<unknown>;
  declare createdAt: CreationOptional<Date>;
  declare createdBy: CreationOptional<number | null>;
  declare appliedAt: CreationOptional<Date | null>;
  declare appliedBy: CreationOptional<number | null>;
  declare undoneAt: CreationOptional<Date | null>;
  declare undoneBy: CreationOptional<number | null>;
}

export function initNetworkImport(sequelize: Sequelize): typeof NetworkImport {
  return NetworkImport.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      state: { type: DataTypes.TEXT, allowNull: false },
      fileName: { type: DataTypes.TEXT, allowNull: false },
      sha256: { type: DataTypes.TEXT, allowNull: false },
      source: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
      attribution: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
      classMapping: { type: DataTypes.JSONB, allowNull: false },
      report: { type: DataTypes.JSONB, allowNull: false },
      payload: { type: DataTypes.JSONB, allowNull: false },
      beforeImage: { type: DataTypes.JSONB },
      createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      createdBy: { type: DataTypes.INTEGER },
      appliedAt: { type: DataTypes.DATE },
      appliedBy: { type: DataTypes.INTEGER },
      undoneAt: { type: DataTypes.DATE },
      undoneBy: { type: DataTypes.INTEGER },
    },
    { sequelize, tableName: 'network_imports', timestamps: false },
  );
}
