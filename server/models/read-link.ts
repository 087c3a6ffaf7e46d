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

/** A link that shows a glider to whoever has it. */
export class ReadLink extends Model<InferAttributes<ReadLink>, InferCreationAttributes<ReadLink>> {
  declare ownerId: string;
  declare gliderId: string;
  declare token: string;
  declare createdAt: CreationOptional<Date>;
  declare glider?: NonAttribute<Glider>;
}

export function initReadLink(sequelize: Sequelize): void {
  ReadLink.init(
    {
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, primaryKey: true },
      token: { type: DataTypes.TEXT, allowNull: false },
      createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'read_links' },
  );
}
