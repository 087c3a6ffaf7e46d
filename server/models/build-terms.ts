import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { BuildTermsInput } from '#shared/schemas/weighing.ts';
import type { User } from './user.ts';

/** What a glider is built and trimmed to; no row while nobody has kept any. */
export class BuildTerms extends Model<InferAttributes<BuildTerms>, InferCreationAttributes<BuildTerms>> {
  declare ownerId: string;
  declare gliderId: string;
  declare body: BuildTermsInput;
  /** counts up from 2; 1 is the state before the first row */
  declare version: number;
  declare updatedAt: CreationOptional<Date>;
  /** null once the account is deleted */
  declare updatedBy: string | null;
  declare editor?: NonAttribute<User>;
}

export function initBuildTerms(sequelize: Sequelize): void {
  BuildTerms.init(
    {
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, primaryKey: true },
      body: { type: DataTypes.JSONB, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false },
      updatedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      updatedBy: { type: DataTypes.UUID, allowNull: true },
    },
    { sequelize, tableName: 'build_terms' },
  );
}
