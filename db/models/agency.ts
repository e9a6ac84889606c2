import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Agency extends Model<InferAttributes<Agency>, InferCreationAttributes<Agency>> {
  declare id: CreationOptional<number>;
  declare name: string;
  declare zone: string;
  declare currency: CreationOptional<string>;
  declare attribution: CreationOptional<string>;
  declare isDemo: CreationOptional<boolean>;
  declare demoAnchorAt: CreationOptional<Date | null>;
}

export function initAgency(sequelize: Sequelize): typeof Agency {
  return Agency.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, defaultValue: 1 },
      name: { type: DataTypes.TEXT, allowNull: false },
      zone: { type: DataTypes.TEXT, allowNull: false },
      currency: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'EUR' },
      attribution: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
      isDemo: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
      demoAnchorAt: { type: DataTypes.DATE },
    },
    { sequelize, tableName: 'agency', timestamps: false },
  );
}
