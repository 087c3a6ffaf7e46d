import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Preferences } from '#shared/schemas/preferences.ts';
import type { UserDto } from '#shared/schemas/session.ts';

/** Somebody who signs in. */
export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare email: string;
  declare passwordHash: string;
  declare role: CreationOptional<UserDto['role']>;
  declare createdAt: CreationOptional<Date>;
  /** since when the address is known to be theirs */
  declare verifiedAt: CreationOptional<Date | null>;
  /** of a husk that others’ rows still point to */
  declare deletedAt: CreationOptional<Date | null>;
  declare preferences: CreationOptional<Preferences>;
}

export function initUser(sequelize: Sequelize): void {
  User.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      name: { type: DataTypes.TEXT, allowNull: false },
      email: { type: DataTypes.TEXT, allowNull: false },
      passwordHash: { type: DataTypes.TEXT, allowNull: false },
      role: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'user' },
      createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      verifiedAt: { type: DataTypes.DATE, allowNull: true },
      deletedAt: { type: DataTypes.DATE, allowNull: true },
      preferences: {
        type: DataTypes.JSONB,
        allowNull: false,
        defaultValue: () => ({ units: {}, theme: 'system' }),
      },
    },
    { sequelize, tableName: 'users' },
  );
}
