import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** What is set to a class, and by when. */
export class Assignment extends Model<
  InferAttributes<Assignment>,
  InferCreationAttributes<Assignment>
> {
  declare id: CreationOptional<string>;
  declare classId: string;
  declare note: CreationOptional<string>;
  declare forChosenLearners: CreationOptional<boolean>;
  declare opensAt: CreationOptional<Date>;
  declare dueAt: Date;
  declare attemptsAllowed: CreationOptional<number | null>;
  declare counting: CreationOptional<'best' | 'latest'>;
  declare lateWork: CreationOptional<'marked' | 'closed'>;
  declare setBy: string;
  declare withdrawnAt: CreationOptional<Date | null>;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static tie(sequelize: Sequelize): void {
    Assignment.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        classId: { type: DataTypes.UUID, allowNull: false },
        note: { type: DataTypes.TEXT, defaultValue: '' },
        forChosenLearners: { type: DataTypes.BOOLEAN, defaultValue: false },
        opensAt: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
        dueAt: { type: DataTypes.DATE, allowNull: false },
        attemptsAllowed: DataTypes.INTEGER,
        counting: { type: DataTypes.TEXT, defaultValue: 'best' },
        lateWork: { type: DataTypes.TEXT, defaultValue: 'marked' },
        setBy: { type: DataTypes.UUID, allowNull: false },
        withdrawnAt: DataTypes.DATE,
        version: { type: DataTypes.INTEGER, defaultValue: 0 },
        createdAt: DataTypes.DATE,
        updatedAt: DataTypes.DATE,
      },
      { sequelize, modelName: 'Assignment', tableName: 'assignments' },
    );
  }
}
