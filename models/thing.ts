import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from "sequelize";
import type { ThingKind } from "@/lib/domain/sheet/things";
import { code, id, instant } from "./columns";

/** A coach, a car or a piece of gear of an organisation: it may go from one rig to another. */
export class Thing extends Model<InferAttributes<Thing>, InferCreationAttributes<Thing>> {
  declare id: string;
  declare organisationId: string;
  declare kind: ThingKind;
  declare createdAt: Date;

  static bind(sequelize: Sequelize): void {
    this.init(
      { id: id({ primaryKey: true }), organisationId: id(), kind: code(), createdAt: instant() },
      { sequelize, modelName: "Thing", tableName: "things" },
    );
  }
}
