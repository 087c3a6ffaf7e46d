import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { ClassLimitDto } from '#shared/schemas/class-edition.ts';

/** An edition of a class with its limits; everybody’s where it is of no club. */
export class ClassEdition extends Model<
  InferAttributes<ClassEdition>,
  InferCreationAttributes<ClassEdition>
> {
  declare id: string;
  declare clubId: string | null;
  declare key: string;
  declare name: string;
  declare issuedBy: string;
  declare edition: string;
  declare note: string;
  declare limits: ClassLimitDto[];
  declare version: CreationOptional<number>;
  declare addedAt: CreationOptional<Date>;
  /** since when it may not change any more */
  declare usedAt: CreationOptional<Date | null>;
}

export function initClassEdition(sequelize: Sequelize): void {
  ClassEdition.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      clubId: { type: DataTypes.UUID, allowNull: true },
      key: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      issuedBy: { type: DataTypes.TEXT, allowNull: false },
      edition: { type: DataTypes.TEXT, allowNull: false },
      note: { type: DataTypes.TEXT, allowNull: false },
      limits: { type: DataTypes.JSONB, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      addedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      usedAt: { type: DataTypes.DATE, allowNull: true },
    },
    { sequelize, tableName: 'class_editions' },
  );
}
