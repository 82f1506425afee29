import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A letter to somebody: waiting, sent, failed, or dropped because it was no longer wanted. */
export class Letter extends Model<InferAttributes<Letter>, InferCreationAttributes<Letter>> {
  declare id: CreationOptional<string>;
  declare messageId: string;
  declare kind: string;
  declare toAddress: string;
  declare personId: CreationOptional<string | null>;
  declare data: object;
  /** Names the cause: a second letter with the same is not written. */
  declare onceKey: CreationOptional<string | null>;
  declare againOf: CreationOptional<string | null>;
  declare state: CreationOptional<'waiting' | 'sent' | 'failed' | 'dropped'>;
  declare tries: CreationOptional<number>;
  declare lastError: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
  declare sendAfter: CreationOptional<Date>;
  declare triedAt: CreationOptional<Date | null>;
  declare sentAt: CreationOptional<Date | null>;

  static tie(sequelize: Sequelize): void {
    Letter.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        messageId: { type: DataTypes.TEXT, allowNull: false },
        kind: { type: DataTypes.TEXT, allowNull: false },
        toAddress: { type: DataTypes.TEXT, allowNull: false },
        personId: DataTypes.UUID,
        data: { type: DataTypes.JSONB, allowNull: false },
        onceKey: DataTypes.TEXT,
        againOf: DataTypes.UUID,
        state: { type: DataTypes.TEXT, defaultValue: 'waiting' },
        tries: { type: DataTypes.INTEGER, defaultValue: 0 },
        lastError: DataTypes.TEXT,
        createdAt: DataTypes.DATE,
        sendAfter: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
        triedAt: DataTypes.DATE,
        sentAt: DataTypes.DATE,
      },
      { sequelize, modelName: 'Letter', tableName: 'letters', updatedAt: false },
    );
  }
}
