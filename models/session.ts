import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A sign-in that is in force until it ends, idles or expires. */
export class Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  declare id: CreationOptional<string>;
  declare secretHash: string;
  declare personId: string;
  declare device: CreationOptional<string>;
  declare createdAt: CreationOptional<Date>;
  declare lastSeenAt: CreationOptional<Date>;
  declare passwordGivenAt: CreationOptional<Date>;
  declare idleMinutes: number;
  declare expiresAt: Date;
  declare endedAt: CreationOptional<Date | null>;

  static tie(sequelize: Sequelize): void {
    Session.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        secretHash: { type: DataTypes.TEXT, allowNull: false },
        personId: { type: DataTypes.UUID, allowNull: false },
        device: { type: DataTypes.TEXT, defaultValue: '' },
        createdAt: DataTypes.DATE,
        lastSeenAt: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
        passwordGivenAt: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
        idleMinutes: { type: DataTypes.INTEGER, allowNull: false },
        expiresAt: { type: DataTypes.DATE, allowNull: false },
        endedAt: DataTypes.DATE,
      },
      { sequelize, modelName: 'Session', tableName: 'sessions', updatedAt: false },
    );
  }
}
