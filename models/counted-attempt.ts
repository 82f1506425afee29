import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** An attempt that counts for an assignment, as the learner's nth. */
export class CountedAttempt extends Model<
  InferAttributes<CountedAttempt>,
  InferCreationAttributes<CountedAttempt>
> {
  declare itemId: string;
  declare learnerId: string;
  declare n: number;
  declare attemptId: string;
  declare late: boolean;

  static tie(sequelize: Sequelize): void {
    CountedAttempt.init(
      {
        itemId: { type: DataTypes.UUID, primaryKey: true },
        learnerId: { type: DataTypes.UUID, primaryKey: true },
        n: { type: DataTypes.INTEGER, primaryKey: true },
        attemptId: { type: DataTypes.UUID, allowNull: false },
        late: { type: DataTypes.BOOLEAN, allowNull: false },
      },
      { sequelize, modelName: 'CountedAttempt', tableName: 'counted_attempts', timestamps: false },
    );
  }
}
