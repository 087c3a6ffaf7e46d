import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { Glider } from './glider.ts';

/** A material that the current plan of a glider holds a copy of. */
export class GliderMaterial extends Model<
  InferAttributes<GliderMaterial>,
  InferCreationAttributes<GliderMaterial>
> {
  declare ownerId: string;
  declare gliderId: string;
  declare materialId: string;
  declare glider?: NonAttribute<Glider>;
}

export function initGliderMaterial(sequelize: Sequelize): void {
  GliderMaterial.init(
    {
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, primaryKey: true },
      materialId: { type: DataTypes.UUID, primaryKey: true },
    },
    { sequelize, tableName: 'glider_materials' },
  );
}
