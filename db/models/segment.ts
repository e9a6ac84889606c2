import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

/** `geometry` (PostGIS) is written and read in SQL, beside the queries that need it. */
export class Segment extends Model<InferAttributes<Segment>, InferCreationAttributes<Segment>> {
  declare id: CreationOptional<number>;
  declare sourceKey: string;
  declare importId: CreationOptional<number | null>;
  declare fromNodeId: number;
  declare toNodeId: number;
  declare name: string;
  declare roadClass: string;
  declare serviceClass: 'A' | 'B' | 'C' | 'D';
  declare lanes: number;
  declare widthM: number;
  declare surface: 'asphalt' | 'concrete' | 'open-graded' | 'gravel' | 'paving';
  declare isBridge: CreationOptional<boolean>;
  declare isTunnel: CreationOptional<boolean>;
  declare exposure: CreationOptional<'open' | 'sheltered' | 'shaded' | 'ridge' | 'shore'>;
  declare speedKmPerH: number;
  declare isOneWay: CreationOptional<boolean>;
  declare isSensitive: CreationOptional<boolean>;
  declare heightM: CreationOptional<number>;
  declare lengthM: number;
  declare assumed: CreationOptional<string[]>;
  /** Attributes set by hand; a repeated import leaves them alone. */
  declare edited: CreationOptional<string[]>;
  declare tags: CreationOptional<unknown>;
  declare retiredAt: CreationOptional<Date | null>;
  declare updatedAt: CreationOptional<Date>;
}

export function initSegment(sequelize: Sequelize): typeof Segment {
  return Segment.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      sourceKey: { type: DataTypes.TEXT, allowNull: false },
      importId: { type: DataTypes.INTEGER },
      fromNodeId: { type: DataTypes.INTEGER, allowNull: false },
      toNodeId: { type: DataTypes.INTEGER, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      roadClass: { type: DataTypes.TEXT, allowNull: false },
      serviceClass: { type: DataTypes.TEXT, allowNull: false },
      lanes: { type: DataTypes.SMALLINT, allowNull: false },
      widthM: { type: DataTypes.DOUBLE, allowNull: false },
      surface: { type: DataTypes.TEXT, allowNull: false },
      isBridge: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
      isTunnel: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
      exposure: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'open' },
      speedKmPerH: { type: DataTypes.DOUBLE, allowNull: false },
      isOneWay: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
      isSensitive: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
      heightM: { type: DataTypes.DOUBLE, allowNull: false, defaultValue: 0 },
      lengthM: { type: DataTypes.DOUBLE, allowNull: false },
      assumed: { type: DataTypes.ARRAY(DataTypes.TEXT), allowNull: false, defaultValue: [] },
      edited: { type: DataTypes.ARRAY(DataTypes.TEXT), allowNull: false, defaultValue: [] },
      tags: { type: DataTypes.JSONB, allowNull: false, defaultValue: {} },
      retiredAt: { type: DataTypes.DATE },
      updatedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'segments', timestamps: false },
  );
}
