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

/** An invitation to a club that nobody has answered yet. */
export class ClubInvitation extends Model<
  InferAttributes<ClubInvitation>,
  InferCreationAttributes<ClubInvitation>
> {
  declare id: string;
  declare clubId: string;
  declare email: string;
  declare role: ClubRole;
  declare tokenHash: string;
  declare invitedBy: string;
  declare invitedAt: CreationOptional<Date>;
  declare expiresAt: Date;
  declare club?: NonAttribute<Club>;
  declare inviter?: NonAttribute<User>;
}

export function initClubInvitation(sequelize: Sequelize): void {
  ClubInvitation.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      clubId: { type: DataTypes.UUID, allowNull: false },
      email: { type: DataTypes.TEXT, allowNull: false },
      role: { type: DataTypes.TEXT, allowNull: false },
      tokenHash: { type: DataTypes.TEXT, allowNull: false },
      invitedBy: { type: DataTypes.UUID, allowNull: false },
      invitedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      expiresAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'club_invitations' },
  );
}
