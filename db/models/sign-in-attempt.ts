import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class SignInAttempt extends Model<InferAttributes<SignInAttempt>, InferCreationAttributes<SignInAttempt>> {
  declare id: CreationOptional<number>;
  declare email: string;
  declare address: string;
  declare attemptedAt: Date;
  declare hasSucceeded: boolean;
}

export function initSignInAttempt(sequelize: Sequelize): typeof SignInAttempt {
  return SignInAttempt.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      email: { type: DataTypes.TEXT, allowNull: false },
      address: { type: DataTypes.TEXT, allowNull: false },
      attemptedAt: { type: DataTypes.DATE, allowNull: false },
      hasSucceeded: { type: DataTypes.BOOLEAN, allowNull: false },
    },
    { sequelize, tableName: 'sign_in_attempts', timestamps: false },
  );
}
