import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { GliderRole } from '#shared/schemas/glider.ts';
import type { Glider } from './glider.ts';
import type { User } from './user.ts';

/**
 * What a user is to a glider. The owner has a row too, so that one look tells. The row carries the glider's place in
 * every order of the bench; the database keeps these columns in step.
 */
export class GliderMember extends Model<
  InferAttributes<GliderMember>,
  InferCreationAttributes<GliderMember>
> {
  declare ownerId: string;
  declare gliderId: string;
  declare userId: string;
  declare role: GliderRole;
  declare joinedAt: CreationOptional<Date>;
  declare nameKey: CreationOptional<string>;
  declare mass: CreationOptional<number>;
  declare changedAt: CreationOptional<Date>;
  declare archived: CreationOptional<boolean>;
  declare glider?: NonAttribute<Glider>;
  declare user?: NonAttribute<User>;
}

export function initGliderMember(sequelize: Sequelize): void {
  GliderMember.init(
    {
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, primaryKey: true },
      userId: { type: DataTypes.UUID, primaryKey: true },
      role: { type: DataTypes.TEXT, allowNull: false },
      joinedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      nameKey: { type: DataTypes.TEXT },
      mass: { type: DataTypes.DOUBLE, field: 'mass_g' },
      changedAt: { type: DataTypes.DATE },
      archived: { type: DataTypes.BOOLEAN },
    },
    { sequelize, tableName: 'glider_members' },
  );
}
