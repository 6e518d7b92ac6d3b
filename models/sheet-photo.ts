import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from "sequelize";
import { count, digest, id, largeCount, words } from "./columns";

/** A photograph that a revision's sheet names, as the sheet says it; its bytes are sent by the organisation that saved it. */
export class SheetPhoto extends Model<InferAttributes<SheetPhoto>, InferCreationAttributes<SheetPhoto>> {
  declare rigId: string;
  declare number: number;
  declare sha256: Buffer;
  declare organisationId: string;
  declare bytes: number;
  declare mime: string;

  static bind(sequelize: Sequelize): void {
    this.init(
      {
        rigId: id({ primaryKey: true }),
        number: count({ primaryKey: true }),
        sha256: { ...digest({ primaryKey: true }), field: "sha256" },
        organisationId: id(),
        bytes: largeCount(),
        mime: words(100),
      },
      { sequelize, modelName: "SheetPhoto", tableName: "sheet_photos" },
    );
  }
}
