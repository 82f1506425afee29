import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A single-use link, known by the hash of its secret. */
export class OneTimeLink extends Model<
  InferAttributes<OneTimeLink>,
  InferCreationAttributes<OneTimeLink>
> {
  declare id: CreationOptional<string>;
  /** Whose it is; null where it leads to an invitation. */
  declare personId: CreationOptional<string | null>;
  declare invitationId: CreationOptional<string | null>;
  declare purpose:
    'set-password' | 'reset-password' | 'confirm-address' | 'change-address' | 'invitation';
  declare secretHash: string;
  declare newEmail: CreationOptional<string | null>;
  declare madeBy: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;

  static tie(sequelize: Sequelize): void {
    OneTimeLink.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        personId: DataTypes.UUID,
        invitationId: DataTypes.UUID,
        purpose: { type: DataTypes.TEXT, allowNull: false },
        secretHash: { type: DataTypes.TEXT, allowNull: false },
        newEmail: DataTypes.TEXT,
        madeBy: DataTypes.UUID,
        createdAt: DataTypes.DATE,
        expiresAt: { type: DataTypes.DATE, allowNull: false },
        usedAt: DataTypes.DATE,
      },
      { sequelize, modelName: 'OneTimeLink', tableName: 'one_time_links', updatedAt: false },
    );
  }
}
