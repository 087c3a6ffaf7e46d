import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { EstimateDto } from '#shared/schemas/estimate.ts';
import type { PlanDto } from '#shared/schemas/plan.ts';
import { figureColumns } from './figures.ts';

/** A balance sheet: frozen plan and frozen result. */
export class Sheet extends Model<InferAttributes<Sheet>, InferCreationAttributes<Sheet>> {
  declare id: CreationOptional<string>;
  declare ownerId: string;
  declare gliderId: string;
  declare number: number;
  declare gliderName: string;
  declare note: string;
  declare plan: PlanDto;
  declare result: EstimateDto;
  declare calculator: string;
  declare sha256: string;
  declare mass: number;
  declare percentMac: number | null;
  declare wingLoading: number | null;
  declare savedBy: string;
  declare savedByName: string;
  declare savedAt: CreationOptional<Date>;
}

export function initSheet(sequelize: Sequelize): void {
  const text = () => ({ type: DataTypes.TEXT, allowNull: false });
  Sheet.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, allowNull: false },
      number: { type: DataTypes.INTEGER, allowNull: false },
      gliderName: text(),
      note: text(),
      plan: { type: DataTypes.JSONB, allowNull: false },
      result: { type: DataTypes.JSONB, allowNull: false },
      calculator: text(),
      sha256: text(),
      ...figureColumns(),
      savedBy: { type: DataTypes.UUID, allowNull: false },
      savedByName: text(),
      savedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'sheets' },
  );
}
