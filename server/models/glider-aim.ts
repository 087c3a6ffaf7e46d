import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { ClassEdition } from './class-edition.ts';

/** The edition of a class that a glider is built for. */
export class GliderAim extends Model<InferAttributes<GliderAim>, InferCreationAttributes<GliderAim>> {
  declare ownerId: string;
  declare gliderId: string;
  declare classEditionId: string;
  declare aimedAt: CreationOptional<Date>;
  declare edition?: NonAttribute<ClassEdition>;
}

export function initGliderAim(sequelize: Sequelize): void {
  GliderAim.init(
    {
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, primaryKey: true },
      classEditionId: { type: DataTypes.UUID, allowNull: false },
      aimedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'glider_aims' },
  );
}
