import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A club: who is in it stands in its members. */
export class Club extends Model<InferAttributes<Club>, InferCreationAttributes<Club>> {
  declare id: string;
  declare name: string;
  declare place: CreationOptional<string>;
  /** counts changes of its name and place */
  declare version: CreationOptional<number>;
  declare foundedBy: string | null;
  declare createdAt: CreationOptional<Date>;
}

export function initClub(sequelize: Sequelize): void {
  Club.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      name: { type: DataTypes.TEXT, allowNull: false },
      place: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      foundedBy: { type: DataTypes.UUID, allowNull: true },
      createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'clubs' },
  );
}
