import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** The answer that a repeated request is to have. */
export class RequestKey extends Model<
  InferAttributes<RequestKey>,
  InferCreationAttributes<RequestKey>
> {
  declare learnerId: string;
  declare key: string;
  declare bodyHash: string;
  declare attemptId: string;
  declare answer: object;
  declare createdAt: CreationOptional<Date>;

  static tie(sequelize: Sequelize): void {
    RequestKey.init(
      {
        learnerId: { type: DataTypes.UUID, primaryKey: true },
        key: { type: DataTypes.UUID, primaryKey: true },
        bodyHash: { type: DataTypes.TEXT, allowNull: false },
        attemptId: { type: DataTypes.UUID, allowNull: false },
        answer: { type: DataTypes.JSONB, allowNull: false },
        createdAt: DataTypes.DATE,
      },
      { sequelize, modelName: 'RequestKey', tableName: 'request_keys', updatedAt: false },
    );
  }
}
