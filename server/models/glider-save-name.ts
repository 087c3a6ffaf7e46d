import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A name given to a saved state; the save itself never changes. */
export class GliderSaveName extends Model<
  InferAttributes<GliderSaveName>,
  InferCreationAttributes<GliderSaveName>
> {
  declare ownerId: string;
  declare gliderId: string;
  declare version: number;
  declare name: string;
}

export function initGliderSaveName(sequelize: Sequelize): void {
  GliderSaveName.init(
    {
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, primaryKey: true },
      version: { type: DataTypes.INTEGER, primaryKey: true },
      name: { type: DataTypes.TEXT, allowNull: false },
    },
    { sequelize, tableName: 'glider_save_names' },
  );
}
