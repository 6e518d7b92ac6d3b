import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from "sequelize";
import { canonicalBytes, count, digest, id, instant } from "./columns";

/** One immutable state of a rig's sheet and list. `digest` is that of `document`'s bytes; `number` counts from 1. */
export class Revision extends Model<InferAttributes<Revision>, InferCreationAttributes<Revision>> {
  declare id: string;
  declare rigId: string;
  declare number: number;
  declare digest: Buffer;
  declare document: Buffer;
  declare createdAt: Date;

  static bind(sequelize: Sequelize): void {
    this.init(
      {
        id: id({ primaryKey: true }),
        rigId: id(),
        number: count(),
        digest: digest(),
        document: canonicalBytes(),
        createdAt: instant(),
      },
      { sequelize, modelName: "Revision", tableName: "revisions" },
    );
  }
}
