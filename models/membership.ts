import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** Who is in a class, as what, from when until when. */
export class Membership extends Model<
  InferAttributes<Membership>,
  InferCreationAttributes<Membership>
> {
  declare id: CreationOptional<string>;
  declare classId: string;
  declare personId: string;
  declare role: 'learner' | 'instructor';
  declare joinedAt: CreationOptional<Date>;
  declare leftAt: CreationOptional<Date | null>;

  static tie(sequelize: Sequelize): void {
    Membership.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        classId: { type: DataTypes.UUID, allowNull: false },
        personId: { type: DataTypes.UUID, allowNull: false },
        role: { type: DataTypes.TEXT, allowNull: false },
        joinedAt: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
        leftAt: DataTypes.DATE,
      },
      { sequelize, modelName: 'Membership', tableName: 'memberships', timestamps: false },
    );
  }
}
