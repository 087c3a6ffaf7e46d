import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { MemberRole } from '#shared/schemas/sharing.ts';
import type { Glider } from './glider.ts';
import type { User } from './user.ts';

/** An invitation to a glider that nobody has answered yet. */
export class Invitation extends Model<InferAttributes<Invitation>, InferCreationAttributes<Invitation>> {
  declare id: string;
  declare ownerId: string;
  declare gliderId: string;
  declare email: string;
  declare role: MemberRole;
  declare tokenHash: string;
  declare invitedBy: string;
  declare invitedAt: CreationOptional<Date>;
  declare expiresAt: Date;
  declare glider?: NonAttribute<Glider>;
  declare inviter?: NonAttribute<User>;
}

export function initInvitation(sequelize: Sequelize): void {
  Invitation.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, allowNull: false },
      email: { type: DataTypes.TEXT, allowNull: false },
      role: { type: DataTypes.TEXT, allowNull: false },
      tokenHash: { type: DataTypes.TEXT, allowNull: false },
      invitedBy: { type: DataTypes.UUID, allowNull: false },
      invitedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      expiresAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'invitations' },
  );
}
