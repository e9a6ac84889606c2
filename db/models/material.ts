import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Material extends Model<InferAttributes<Material>, InferCreationAttributes<Material>> {
  declare id: CreationOptional<number>;
  declare name: string;
  declare form: 'solid' | 'prewet' | 'liquid' | 'abrasive';
  declare composition: unknown;
  declare waterMassFraction: number;
  declare densityKgPerM3: number;
  declare costCentsPerTonne: number;
  declare practicalMinimumC: CreationOptional<number | null>;
  declare solidMaterialId: CreationOptional<number | null>;
  declare liquidMaterialId: CreationOptional<number | null>;
  declare liquidMassFraction: CreationOptional<number | null>;
  declare isActive: CreationOptional<boolean>;
}

export function initMaterial(sequelize: Sequelize): typeof Material {
  return Material.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      name: { type: DataTypes.TEXT, allowNull: false },
      form: { type: DataTypes.TEXT, allowNull: false },
      composition: { type: DataTypes.JSONB, allowNull: false },
      waterMassFraction: { type: DataTypes.DOUBLE, allowNull: false },
      densityKgPerM3: { type: DataTypes.DOUBLE, allowNull: false },
      costCentsPerTonne: { type: DataTypes.INTEGER, allowNull: false },
      practicalMinimumC: { type: DataTypes.DOUBLE },
      solidMaterialId: { type: DataTypes.INTEGER },
      liquidMaterialId: { type: DataTypes.INTEGER },
      liquidMassFraction: { type: DataTypes.DOUBLE },
      isActive: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: true },
    },
    { sequelize, tableName: 'materials', timestamps: false },
  );
}
