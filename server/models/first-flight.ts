import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { FirstFlightDto, FirstFlightInput } from '#shared/schemas/first-flight.ts';

/** A signed record of a first flight; never changed. */
export class FirstFlight extends Model<InferAttributes<FirstFlight>, InferCreationAttributes<FirstFlight>> {
  declare id: string;
  declare ownerId: string;
  declare gliderId: string;
  declare number: number;
  declare body: FirstFlightInput;
  declare measured: FirstFlightDto['measured'];
  declare flown: FirstFlightDto['flown'];
  declare follows: string | null;
  declare signedBy: string;
  declare signedByName: string;
  declare receivedAt: CreationOptional<Date>;
}

export function initFirstFlight(sequelize: Sequelize): void {
  FirstFlight.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      ownerId: { type: DataTypes.UUID, allowNull: false },
      gliderId: { type: DataTypes.UUID, allowNull: false },
      number: { type: DataTypes.INTEGER, allowNull: false },
      body: { type: DataTypes.JSONB, allowNull: false },
      measured: { type: DataTypes.JSONB, allowNull: false },
      flown: { type: DataTypes.JSONB, allowNull: false },
      follows: { type: DataTypes.UUID, allowNull: true },
      signedBy: { type: DataTypes.UUID, allowNull: false },
      signedByName: { type: DataTypes.TEXT, allowNull: false },
      receivedAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    },
    { sequelize, tableName: 'first_flights' },
  );
}
