import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { GliderRole } from '#shared/schemas/glider.ts';

/** What a user is to a glider. The owner has a row too, so that one look tells. */
export class GliderMember extends Model<
  InferAttributes<GliderMember>,
  InferCreationAttributes<GliderMember>
> {
  declare ownerId: string;
  declare gliderId: string;
  declare userId: string;
  declare role: GliderRole;
}

export function initGliderMember(sequelize: Sequelize): void {
  GliderMember.init(
    {
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, primaryKey: true },
      userId: { type: DataTypes.UUID, primaryKey: true },
      role: { type: DataTypes.TEXT, allowNull: false },
    },
    { sequelize, tableName: 'glider_members' },
  );
}
