import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { WeighingInput } from '#shared/schemas/weighing.ts';

/** What a scale said of parts of a glider; never changed. */
export class Weighing extends Model<InferAttributes<Weighing>, InferCreationAttributes<Weighing>> {
  declare id: string;
  declare ownerId: string;
  declare gliderId: string;
  declare number: number;
  declare body: WeighingInput;
  /** the one whose place it takes */
  declare corrects: string | null;
  declare weighedBy: string;
  declare weighedByName: string;
  declare receivedAt: CreationOptional<Date>;
}

export function initWeighing(sequelize: Sequelize): void {
  Weighing.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, allowNull: false },
      number: { type: DataTypes.INTEGER, allowNull: false },
      body: { type: DataTypes.JSONB, allowNull: false },
      corrects: { type: DataTypes.UUID, allowNull: true },
      weighedBy: { type: DataTypes.UUID, allowNull: false },
      weighedByName: { type: DataTypes.TEXT, allowNull: false },
      receivedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'weighings' },
  );
}
