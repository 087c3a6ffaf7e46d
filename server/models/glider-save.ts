import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { SaveChanges } from '#shared/schemas/glider-save.ts';
import type { PlanDto } from '#shared/schemas/plan.ts';
import { figureColumns } from './figures.ts';
import type { User } from './user.ts';

/** One save of a glider: a row of its log, never changed. */
export class GliderSave extends Model<InferAttributes<GliderSave>, InferCreationAttributes<GliderSave>> {
  declare ownerId: string;
  declare gliderId: string;
  declare version: number;
  declare plan: PlanDto;
  declare mass: number;
  declare percentMac: number | null;
  declare wingLoading: number | null;
  declare savedBy: string;
  declare savedAt: CreationOptional<Date>;
  /** null for the first save */
  declare changes: CreationOptional<SaveChanges | null>;
  /** the version that was brought back */
  declare restoredFrom: CreationOptional<number | null>;
  declare author?: NonAttribute<User>;
}

export function initGliderSave(sequelize: Sequelize): void {
  GliderSave.init(
    {
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, primaryKey: true },
      version: { type: DataTypes.INTEGER, primaryKey: true },
      plan: { type: DataTypes.JSONB, allowNull: false },
      ...figureColumns(),
      savedBy: { type: DataTypes.UUID, allowNull: false },
      savedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      changes: { type: DataTypes.JSONB, allowNull: true },
      restoredFrom: { type: DataTypes.INTEGER, allowNull: true },
    },
    { sequelize, tableName: 'glider_saves' },
  );
}
