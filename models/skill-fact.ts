import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** What a round showed of a skill; pegs are worked out from these. */
export class SkillFact extends Model<
  InferAttributes<SkillFact>,
  InferCreationAttributes<SkillFact>
> {
  declare roundId: string;
  declare skill: string;
  declare learnerId: string;
  declare closedAt: Date;
  declare wasRight: boolean;
  declare unaided: boolean;
  declare attempts: number;

  static tie(sequelize: Sequelize): void {
    SkillFact.init(
      {
        roundId: { type: DataTypes.UUID, primaryKey: true },
        skill: { type: DataTypes.TEXT, primaryKey: true },
        learnerId: { type: DataTypes.UUID, allowNull: false },
        closedAt: { type: DataTypes.DATE, allowNull: false },
        wasRight: { type: DataTypes.BOOLEAN, allowNull: false },
        unaided: { type: DataTypes.BOOLEAN, allowNull: false },
        attempts: { type: DataTypes.INTEGER, allowNull: false },
      },
      { sequelize, modelName: 'SkillFact', tableName: 'skill_facts', timestamps: false },
    );
  }
}
