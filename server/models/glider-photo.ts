import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { User } from './user.ts';

/** A photo of a glider; its picture lies in the file store. */
export class GliderPhoto extends Model<InferAttributes<GliderPhoto>, InferCreationAttributes<GliderPhoto>> {
  declare id: string;
  declare ownerId: string;
  declare gliderId: string;
  /** names the stored files */
  declare file: string;
  declare caption: string;
  declare width: number;
  declare height: number;
  declare addedBy: string;
  declare addedAt: CreationOptional<Date>;
  declare adder?: NonAttribute<User>;
}

export function initGliderPhoto(sequelize: Sequelize): void {
  GliderPhoto.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, allowNull: false },
      file: { type: DataTypes.UUID, allowNull: false },
      caption: { type: DataTypes.TEXT, allowNull: false },
      width: { type: DataTypes.INTEGER, allowNull: false, field: 'width_px' },
      height: { type: DataTypes.INTEGER, allowNull: false, field: 'height_px' },
      addedBy: { type: DataTypes.UUID, allowNull: false },
      addedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'glider_photos' },
  );
}
