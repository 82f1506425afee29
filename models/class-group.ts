import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** A class: learners with one or more instructors. */
export class ClassGroup extends Model<
  InferAttributes<ClassGroup>,
  InferCreationAttributes<ClassGroup>
> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare timeZone: CreationOptional<string>;
  declare startsOn: CreationOptional<string | null>;
  declare endsOn: CreationOptional<string | null>;
  declare joiningWord: CreationOptional<string | null>;
  declare joiningOpen: CreationOptional<boolean>;
  declare archivedAt: CreationOptional<Date | null>;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static tie(sequelize: Sequelize): void {
    ClassGroup.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        name: { type: DataTypes.TEXT, allowNull: false },
        timeZone: { type: DataTypes.TEXT, defaultValue: 'Europe/London' },
        startsOn: DataTypes.DATEONLY,
        endsOn: DataTypes.DATEONLY,
        joiningWord: DataTypes.TEXT,
        joiningOpen: { type: DataTypes.BOOLEAN, defaultValue: false },
        archivedAt: DataTypes.DATE,
        version: { type: DataTypes.INTEGER, defaultValue: 0 },
        createdAt: DataTypes.DATE,
        updatedAt: DataTypes.DATE,
      },
      { sequelize, modelName: 'ClassGroup', tableName: 'class_groups' },
    );
  }
}
