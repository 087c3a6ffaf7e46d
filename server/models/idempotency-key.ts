import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** What a user's request with this key has made, so that its repetition makes nothing more. */
export class IdempotencyKey extends Model<
  InferAttributes<IdempotencyKey>,
  InferCreationAttributes<IdempotencyKey>
> {
  declare userId: string;
  declare key: string;
  /** what was asked for, such as `glider` or `sheet of <glider id>` */
  declare purpose: string;
  declare madeId: string;
  declare createdAt: CreationOptional<Date>;
}

export function initIdempotencyKey(sequelize: Sequelize): void {
  IdempotencyKey.init(
    {
      userId: { type: DataTypes.UUID, primaryKey: true },
      key: { type: DataTypes.UUID, primaryKey: true },
      purpose: { type: DataTypes.TEXT, allowNull: false },
      madeId: { type: DataTypes.UUID, allowNull: false },
      createdAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'idempotency_keys' },
  );
}
