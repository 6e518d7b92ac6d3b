import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from "sequelize";
import { count, digest, id, largeCount, words } from "./columns";

/** A photograph that a stored entry names, as the entry says it, so that it is found by its digest. */
export class PhotoEntry extends Model<InferAttributes<PhotoEntry>, InferCreationAttributes<PhotoEntry>> {
  declare walkId: string;
  declare seq: number;
  declare check: string | null;
  declare sha256: Buffer;
  declare bytes: number;
  declare mime: string;

  static bind(sequelize: Sequelize): void {
    this.init(
      {
        walkId: id({ primaryKey: true }),
        seq: count({ primaryKey: true }),
        check: { ...words(100, { allowNull: true }), field: "check_key" },
        sha256: { ...digest(), field: "sha256" },
        bytes: largeCount(),
        mime: words(100),
      },
      { sequelize, modelName: "PhotoEntry", tableName: "photo_entries" },
    );
  }
}
