import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** One response with its marking; never changed, never removed. */
export class Attempt extends Model<InferAttributes<Attempt>, InferCreationAttributes<Attempt>> {
  declare id: CreationOptional<string>;
  declare roundId: string;
  declare learnerId: string;
  declare exerciseId: string;
  declare response: object;
  declare marking: object;
  declare verdict: 'right' | 'partly' | 'wrong';
  declare credit: number;
  declare unaided: boolean;
  declare closesRound: boolean;
  declare answeredAt: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;

  static tie(sequelize: Sequelize): void {
    Attempt.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        roundId: { type: DataTypes.UUID, allowNull: false },
        learnerId: { type: DataTypes.UUID, allowNull: false },
        exerciseId: { type: DataTypes.TEXT, allowNull: false },
        response: { type: DataTypes.JSONB, allowNull: false },
        marking: { type: DataTypes.JSONB, allowNull: false },
        verdict: { type: DataTypes.TEXT, allowNull: false },
        credit: { type: DataTypes.DOUBLE, allowNull: false },
        unaided: { type: DataTypes.BOOLEAN, allowNull: false },
        closesRound: { type: DataTypes.BOOLEAN, allowNull: false },
        answeredAt: DataTypes.DATE,
        createdAt: DataTypes.DATE,
      },
      { sequelize, modelName: 'Attempt', tableName: 'attempts', updatedAt: false },
    );
  }
}
