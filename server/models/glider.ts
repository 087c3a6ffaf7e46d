import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { PlanDto } from '#shared/schemas/plan.ts';
import { figureColumns } from './figures.ts';
import type { User } from './user.ts';

/** A glider as last saved: its plan, and beside it what a list of gliders shows. */
export class Glider extends Model<InferAttributes<Glider>, InferCreationAttributes<Glider>> {
  declare id: CreationOptional<string>;
  declare ownerId: string;
  declare name: string;
  declare plan: PlanDto;
  declare version: CreationOptional<number>;
  declare mass: number;
  declare percentMac: number | null;
  declare wingLoading: number | null;
  /** mm aft of the datum */
  declare balance: CreationOptional<number | null>;
  declare outline: [number, number][];
  declare updatedBy: string;
  declare updatedAt: CreationOptional<Date>;
  declare archivedAt: CreationOptional<Date | null>;
  declare owner?: NonAttribute<User>;
  declare editor?: NonAttribute<User>;
}

export function initGlider(sequelize: Sequelize): void {
  Glider.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      ownerId: { type: DataTypes.UUID, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      plan: { type: DataTypes.JSONB, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      ...figureColumns(),
      balance: { type: DataTypes.DOUBLE, allowNull: true, field: 'balance_mm' },
      outline: { type: DataTypes.JSONB, allowNull: false },
      updatedBy: { type: DataTypes.UUID, allowNull: false },
      updatedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      archivedAt: { type: DataTypes.DATE, allowNull: true },
    },
    { sequelize, tableName: 'gliders' },
  );
}
