import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** Somebody was asked to come in; known by their address until they have accepted. */
export class Invitation extends Model<
  InferAttributes<Invitation>,
  InferCreationAttributes<Invitation>
> {
  declare id: CreationOptional<string>;
  declare classId: CreationOptional<string | null>;
  declare role: CreationOptional<'learner' | 'instructor' | null>;
  declare email: string;
  declare name: CreationOptional<string | null>;
  declare invitedBy: CreationOptional<string | null>;
  /** The word that they came with, when nobody invited them by name. */
  declare joiningWord: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
  declare sentAt: CreationOptional<Date>;
  declare expiresAt: Date;
  declare acceptedAt: CreationOptional<Date | null>;
  declare acceptedBy: CreationOptional<string | null>;
  declare withdrawnAt: CreationOptional<Date | null>;

  static tie(sequelize: Sequelize): void {
    Invitation.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        classId: DataTypes.UUID,
        role: DataTypes.TEXT,
        email: { type: DataTypes.TEXT, allowNull: false },
        name: DataTypes.TEXT,
        invitedBy: DataTypes.UUID,
        joiningWord: DataTypes.TEXT,
        createdAt: DataTypes.DATE,
        sentAt: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
        expiresAt: { type: DataTypes.DATE, allowNull: false },
        acceptedAt: DataTypes.DATE,
        acceptedBy: DataTypes.UUID,
        withdrawnAt: DataTypes.DATE,
      },
      { sequelize, modelName: 'Invitation', tableName: 'invitations', updatedAt: false },
    );
  }
}
