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

/** A browser that is signed in; of its secret id only the SHA-256 is kept. */
export class Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  declare idHash: string;
  declare userId: string;
  declare expiresAt: Date;
  declare createdAt: CreationOptional<Date>;
  /** by which the user’s list names it; no secret */
  declare id: CreationOptional<string>;
  /** such as “Firefox on Windows” */
  declare device: CreationOptional<string>;
  /** to the hour */
  declare lastUsedAt: CreationOptional<Date>;
  declare user?: NonAttribute<User>;
}

export function initSession(sequelize: Sequelize): void {
  Session.init(
    {
      idHash: { type: DataTypes.TEXT, primaryKey: true },
      userId: { type: DataTypes.UUID, allowNull: false },
      expiresAt: { type: DataTypes.DATE, allowNull: false },
      createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      id: { type: DataTypes.UUID, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      device: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
      lastUsedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'sessions' },
  );
}
