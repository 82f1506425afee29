import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** The opaque key under which a person's rounds, attempts and progress are kept. */
export class Learner extends Model<InferAttributes<Learner>, InferCreationAttributes<Learner>> {
  declare id: CreationOptional<string>;
  declare personId: string | null;
  declare createdAt: CreationOptional<Date>;

  static tie(sequelize: Sequelize): void {
    Learner.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        personId: DataTypes.UUID,
        createdAt: DataTypes.DATE,
      },
      { sequelize, modelName: 'Learner', tableName: 'learners', updatedAt: false },
    );
  }
}
