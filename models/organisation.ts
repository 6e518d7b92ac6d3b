import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from "sequelize";
import type { OrganisationKind } from "@/lib/domain/member";
import { code, id, name } from "./columns";

/** A household, shop or fleet. */
export class Organisation extends Model<
  InferAttributes<Organisation>,
  InferCreationAttributes<Organisation>
> {
  declare id: string;
  declare name: string;
  declare kind: OrganisationKind;

  static bind(sequelize: Sequelize): void {
    this.init(
      { id: id({ primaryKey: true }), name: name(), kind: code() },
      { sequelize, modelName: "Organisation", tableName: "organisations" },
    );
  }
}
