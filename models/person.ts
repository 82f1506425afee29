import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** Identity: who somebody is, and how they like things shown. */
export class Person extends Model<InferAttributes<Person>, InferCreationAttributes<Person>> {
  declare id: CreationOptional<string>;
  declare email: string | null;
  declare emailConfirmedAt: CreationOptional<Date | null>;
  declare name: string;
  declare passwordHash: CreationOptional<string | null>;
  declare passwordSetAt: CreationOptional<Date | null>;
  declare timeZone: CreationOptional<string>;
  declare units: CreationOptional<'metric' | 'inch'>;
  declare paper: CreationOptional<'a4' | 'a3' | 'letter' | 'tabloid'>;
  declare reducedMotion: CreationOptional<boolean>;
  /** Letters about classes; what the account itself needs is always sent. */
  declare wantsClassMail: CreationOptional<boolean>;
  declare isAdministrator: CreationOptional<boolean>;
  declare disabledAt: CreationOptional<Date | null>;
  declare erasedAt: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  static tie(sequelize: Sequelize): void {
    Person.init(
      {
        id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
        email: { type: DataTypes.TEXT, allowNull: true },
        emailConfirmedAt: DataTypes.DATE,
        name: { type: DataTypes.TEXT, allowNull: false },
        passwordHash: DataTypes.TEXT,
        passwordSetAt: DataTypes.DATE,
        timeZone: { type: DataTypes.TEXT, defaultValue: 'Europe/London' },
        units: { type: DataTypes.TEXT, defaultValue: 'metric' },
        paper: { type: DataTypes.TEXT, defaultValue: 'a4' },
        reducedMotion: { type: DataTypes.BOOLEAN, defaultValue: false },
        wantsClassMail: { type: DataTypes.BOOLEAN, defaultValue: true },
        isAdministrator: { type: DataTypes.BOOLEAN, defaultValue: false },
        disabledAt: DataTypes.DATE,
        erasedAt: DataTypes.DATE,
        createdAt: DataTypes.DATE,
        updatedAt: DataTypes.DATE,
      },
      { sequelize, modelName: 'Person', tableName: 'people' },
    );
  }
}
