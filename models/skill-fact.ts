import {
  DataTypes,
  Model,
  type CreationOptional,
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
  declare firstTriedAt: Date;
  declare closedAt: CreationOptional<Date | null>;
  declare rightUnaided: CreationOptional<boolean | null>;

  static tie(sequelize: Sequelize): void {
    SkillFact.init(
      {
        roundId: { type: DataTypes.UUID, primaryKey: true },
        skill: { type: DataTypes.TEXT, primaryKey: true },
        learnerId: { type: DataTypes.UUID, allowNull: false },
        firstTriedAt: { type: DataTypes.DATE, allowNull: false },
        closedAt: DataTypes.DATE,
        rightUnaided: DataTypes.BOOLEAN,
      },
      { sequelize, modelName: 'SkillFact', tableName: 'skill_facts', timestamps: false },
    );
  }
}
