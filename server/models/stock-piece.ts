import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { StockMaterial, StockPieceDto, StockState } from '#shared/schemas/stock-piece.ts';
import type { User } from './user.ts';

/** A sheet, stick, block or tube of a user's rack, also after it was cut up or built into something. */
export class StockPiece extends Model<InferAttributes<StockPiece>, InferCreationAttributes<StockPiece>> {
  declare id: string;
  declare userId: string;
  declare number: number;
  declare kind: StockPieceDto['kind'];
  declare materialKey: string | null;
  declare materialName: string;
  declare materialCategory: StockMaterial['category'];
  declare length: number;
  declare width: number;
  declare thickness: number;
  declare wall: number | null;
  declare mass: number | null;
  declare resolution: number | null;
  declare density: number | null;
  declare grade: string;
  declare grainCut: StockPieceDto['grainCut'];
  declare note: string;
  declare state: CreationOptional<StockState>;
  declare weighed: boolean;
  /** what it is reserved for or used in */
  declare gliderId: CreationOptional<string | null>;
  declare parentId: CreationOptional<string | null>;
  declare parentNumber: CreationOptional<number | null>;
  /** names the stored files */
  declare photoFile: CreationOptional<string | null>;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
  declare user?: NonAttribute<User>;
}

export function initStockPiece(sequelize: Sequelize): void {
  const figure = (field: string, allowNull: boolean) => ({ type: DataTypes.DOUBLE, allowNull, field });
  const text = () => ({ type: DataTypes.TEXT, allowNull: false });
  const moment = () => ({ type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW });
  StockPiece.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      userId: { type: DataTypes.UUID, allowNull: false },
      number: { type: DataTypes.INTEGER, allowNull: false },
      kind: text(),
      materialKey: { type: DataTypes.TEXT, allowNull: true },
      materialName: text(),
      materialCategory: text(),
      length: figure('length_mm', false),
      width: figure('width_mm', false),
      thickness: figure('thickness_mm', false),
      wall: figure('wall_mm', true),
      mass: figure('mass_g', true),
      resolution: figure('resolution_g', true),
      density: figure('density_kg_m3', true),
      grade: text(),
      grainCut: { type: DataTypes.TEXT, allowNull: true },
      note: text(),
      state: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'free' },
      weighed: { type: DataTypes.BOOLEAN, allowNull: false },
      gliderId: { type: DataTypes.UUID, allowNull: true },
      parentId: { type: DataTypes.UUID, allowNull: true },
      parentNumber: { type: DataTypes.INTEGER, allowNull: true },
      photoFile: { type: DataTypes.UUID, allowNull: true },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      createdAt: moment(),
      updatedAt: moment(),
    },
    { sequelize, tableName: 'stock_pieces' },
  );
}
