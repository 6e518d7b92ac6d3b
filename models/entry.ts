import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from "sequelize";
import { canonicalBytes, count, digest, id, instant } from "./columns";

/** One entry of a walk: the canonical bytes as they were sent. Never updated. */
export class Entry extends Model<InferAttributes<Entry>, InferCreationAttributes<Entry>> {
  declare walkId: string;
  declare seq: number;
  declare digest: Buffer;
  declare bytes: Buffer;
  declare receivedAt: Date;

  static bind(sequelize: Sequelize): void {
    this.init(
      {
        walkId: id({ primaryKey: true }),
        seq: count({ primaryKey: true }),
        digest: digest(),
        bytes: canonicalBytes(),
        receivedAt: instant(),
      },
      { sequelize, modelName: "Entry", tableName: "entries" },
    );
  }
}
