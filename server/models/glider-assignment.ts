import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { AssignmentInput } from '#shared/schemas/assignment.ts';
import type { User } from './user.ts';

/** Which part of a glider is cut from which stock piece; no row while nobody has kept one. */
export class GliderAssignment extends Model<
  InferAttributes<GliderAssignment>,
  InferCreationAttributes<GliderAssignment>
> {
  declare ownerId: string;
  declare gliderId: string;
  declare entries: AssignmentInput['entries'];
  declare terms: AssignmentInput['terms'];
  /** the saved plan that it was made for */
  declare gliderVersion: number;
  /** counts up from 2; 1 is the state before the first row */
  declare version: number;
  declare updatedAt: CreationOptional<Date>;
  /** null once the account is deleted */
  declare updatedBy: string | null;
  declare editor?: NonAttribute<User>;
}

export function initGliderAssignment(sequelize: Sequelize): void {
  GliderAssignment.init(
    {
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, primaryKey: true },
      entries: { type: DataTypes.JSONB, allowNull: false },
      terms: { type: DataTypes.JSONB, allowNull: false },
      gliderVersion: { type: DataTypes.INTEGER, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false },
      updatedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      updatedBy: { type: DataTypes.UUID, allowNull: true },
    },
    { sequelize, tableName: 'glider_assignments' },
  );
}
