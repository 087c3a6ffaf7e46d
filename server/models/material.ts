import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { MaterialDto } from '#shared/schemas/material.ts';

/** A row of the table of materials: everybody's where it has no owner, else private. */
export class Material extends Model<InferAttributes<Material>, InferCreationAttributes<Material>> {
  declare id: CreationOptional<string>;
  declare key: string;
  declare ownerId: CreationOptional<string | null>;
  declare name: string;
  declare category: MaterialDto['category'];
  declare density: number | null;
  declare areal: number | null;
  declare spread: number | null;
  declare cv: number;
  declare modulus: number | null;
  declare strength: number | null;
  declare moisture: number | null;
  declare form: string;
  declare source: string;
  declare basis: MaterialDto['basis'];
  declare version: CreationOptional<number>;
  declare updatedAt: CreationOptional<Date>;
}

export function initMaterial(sequelize: Sequelize): void {
  const figure = (field: string) => ({ type: DataTypes.DOUBLE, allowNull: true, field });
  const text = () => ({ type: DataTypes.TEXT, allowNull: false });
  Material.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      key: text(),
      ownerId: { type: DataTypes.UUID, allowNull: true },
      name: text(),
      category: text(),
      density: figure('density_kg_m3'),
      areal: figure('areal_g_m2'),
      spread: figure('spread_g_m2'),
      cv: { type: DataTypes.DOUBLE, allowNull: false },
      modulus: figure('modulus_gpa'),
      strength: figure('strength_mpa'),
      moisture: figure('moisture'),
      form: text(),
      source: text(),
      basis: text(),
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      updatedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'materials' },
  );
}
