import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { Glider } from './glider.ts';

/** A glider that its owner lets the whole club see. */
export class ClubGlider extends Model<InferAttributes<ClubGlider>, InferCreationAttributes<ClubGlider>> {
  declare clubId: string;
  declare ownerId: string;
  declare gliderId: string;
  declare sharedAt: CreationOptional<Date>;
  declare glider?: NonAttribute<Glider>;
}

export function initClubGlider(sequelize: Sequelize): void {
  ClubGlider.init(
    {
      clubId: { type: DataTypes.UUID, primaryKey: true },
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, primaryKey: true },
      sharedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'club_gliders' },
  );
}
