import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** One learner's turn at one exercise, with the variant as it was drawn. */
export class Round extends Model<InferAttributes<Round>, InferCreationAttributes<Round>> {
  declare id: CreationOptional<string>;
  declare learnerId: string;
  declare exerciseId: string;
  declare definitionVersion: number;
  declare units: 'metric' | 'inch';
  declare seed: number;
  declare variant: object;
  declare shown: object;
  declare openedAt: CreationOptional<Date>;
  declare hintsTaken: CreationOptional<number>;
  declare solutionSeenAt: CreationOptional<Date | null>;
  declare closedAt: CreationOptional<Date | null>;

  static tie(sequelize: Sequelize): void {
    Round.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        learnerId: { type: DataTypes.UUID, allowNull: false },
        exerciseId: { type: DataTypes.TEXT, allowNull: false },
        definitionVersion: { type: DataTypes.INTEGER, allowNull: false },
        units: { type: DataTypes.TEXT, allowNull: false },
        seed: { type: DataTypes.BIGINT, allowNull: false },
        variant: { type: DataTypes.JSONB, allowNull: false },
        shown: { type: DataTypes.JSONB, allowNull: false },
        openedAt: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
        hintsTaken: { type: DataTypes.SMALLINT, defaultValue: 0 },
        solutionSeenAt: DataTypes.DATE,
        closedAt: DataTypes.DATE,
      },
      { sequelize, modelName: 'Round', tableName: 'rounds', timestamps: false },
    );
  }
}
