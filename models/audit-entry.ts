import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';

/** Who did what to whose records; never changed, never removed. */
export class AuditEntry extends Model<
  InferAttributes<AuditEntry>,
  InferCreationAttributes<AuditEntry>
> {
  declare id: CreationOptional<string>;
  declare at: CreationOptional<Date>;
  declare actorId: CreationOptional<string | null>;
  declare action: string;
  declare objectKind: string;
  declare objectId: CreationOptional<string | null>;
  declare classId: CreationOptional<string | null>;
  declare detail: CreationOptional<object>;

  static tie(sequelize: Sequelize): void {
    AuditEntry.init(
      {
        id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
        at: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
        actorId: DataTypes.UUID,
        action: { type: DataTypes.TEXT, allowNull: false },
        objectKind: { type: DataTypes.TEXT, allowNull: false },
        objectId: DataTypes.TEXT,
        classId: DataTypes.UUID,
        detail: { type: DataTypes.JSONB, defaultValue: {} },
      },
      { sequelize, modelName: 'AuditEntry', tableName: 'audit_entries', timestamps: false },
    );
  }
}
