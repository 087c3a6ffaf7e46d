import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { TrialsInput } from '#shared/schemas/trials.ts';
import type { User } from './user.ts';

/** Wood trials kept with a glider; no row while nobody has kept any. */
export class GliderTrials extends Model<
  InferAttributes<GliderTrials>,
  InferCreationAttributes<GliderTrials>
> {
  declare ownerId: string;
  declare gliderId: string;
  declare trials: TrialsInput['trials'];
  declare terms: TrialsInput['terms'];
  /** counts up from 2; 1 is the state before the first row */
  declare version: number;
  declare updatedAt: CreationOptional<Date>;
  /** null once the account is deleted */
  declare updatedBy: string | null;
  declare editor?: NonAttribute<User>;
}

export function initGliderTrials(sequelize: Sequelize): void {
  GliderTrials.init(
    {
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, primaryKey: true },
      trials: { type: DataTypes.JSONB, allowNull: false },
      terms: { type: DataTypes.JSONB, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false },
      updatedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      updatedBy: { type: DataTypes.UUID, allowNull: true },
    },
    { sequelize, tableName: 'glider_trials' },
  );
}
