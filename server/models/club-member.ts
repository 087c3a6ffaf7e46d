import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { ClubRole } from '#shared/schemas/club.ts';
import type { Club } from './club.ts';
import type { User } from './user.ts';

/** What a user is in a club. */
export class ClubMember extends Model<InferAttributes<ClubMember>, InferCreationAttributes<ClubMember>> {
  declare clubId: string;
  declare userId: string;
  declare role: ClubRole;
  declare joinedAt: CreationOptional<Date>;
  declare club?: NonAttribute<Club>;
  declare user?: NonAttribute<User>;
}

export function initClubMember(sequelize: Sequelize): void {
  ClubMember.init(
    {
      clubId: { type: DataTypes.UUID, primaryKey: true },
      userId: { type: DataTypes.UUID, primaryKey: true },
      role: { type: DataTypes.TEXT, allowNull: false },
      joinedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'club_members' },
  );
}
