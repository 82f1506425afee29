import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** One exercise of an assignment, and the lesson with which it was set. */
export class AssignmentItem extends Model<
  InferAttributes<AssignmentItem>,
  InferCreationAttributes<AssignmentItem>
> {
  declare id: CreationOptional<string>;
  declare assignmentId: string;
  declare position: number;
  declare lessonId: CreationOptional<string | null>;
  declare exerciseId: string;

  static tie(sequelize: Sequelize): void {
    AssignmentItem.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        assignmentId: { type: DataTypes.UUID, allowNull: false },
        position: { type: DataTypes.INTEGER, allowNull: false },
        lessonId: DataTypes.TEXT,
        exerciseId: { type: DataTypes.TEXT, allowNull: false },
      },
      { sequelize, modelName: 'AssignmentItem', tableName: 'assignment_items', timestamps: false },
    );
  }
}
