import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { User } from './user.ts';

/** A link that was mailed to a user and not followed yet; only the hash of its token is kept. */
export class MailedLink extends Model<InferAttributes<MailedLink>, InferCreationAttributes<MailedLink>> {
  declare tokenHash: string;
  declare userId: string;
  declare purpose: 'verify' | 'reset';
  /** the address that it was sent to */
  declare email: string;
  declare expiresAt: Date;
  declare user?: NonAttribute<User>;
}

export function initMailedLink(sequelize: Sequelize): void {
  MailedLink.init(
    {
      tokenHash: { type: DataTypes.TEXT, primaryKey: true },
      userId: { type: DataTypes.UUID, allowNull: false },
      purpose: { type: DataTypes.TEXT, allowNull: false },
      email: { type: DataTypes.TEXT, allowNull: false },
      expiresAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'mailed_links' },
  );
}
