import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A mail that was written; its words go once it is sent. */
export class Mail extends Model<InferAttributes<Mail>, InferCreationAttributes<Mail>> {
  declare id: string;
  declare to: string;
  declare subject: string;
  declare text: string;
  declare html: string;
  declare writtenAt: CreationOptional<Date>;
  /** when it is tried next; null when it is sent, given up or only shown */
  declare dueAt: CreationOptional<Date | null>;
  declare attempts: CreationOptional<number>;
  declare lastError: CreationOptional<string | null>;
  declare sentAt: CreationOptional<Date | null>;
}

export function initMail(sequelize: Sequelize): void {
  Mail.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true },
      to: { type: DataTypes.TEXT, allowNull: false, field: 'recipient' },
      subject: { type: DataTypes.TEXT, allowNull: false },
      text: { type: DataTypes.TEXT, allowNull: false, field: 'body_text' },
      html: { type: DataTypes.TEXT, allowNull: false, field: 'body_html' },
      writtenAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
      dueAt: { type: DataTypes.DATE, allowNull: true, defaultValue: DataTypes.NOW },
      attempts: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
      lastError: { type: DataTypes.TEXT, allowNull: true },
      sentAt: { type: DataTypes.DATE, allowNull: true },
    },
    { sequelize, tableName: 'mails' },
  );
}
