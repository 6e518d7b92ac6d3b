import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from "sequelize";
import type { Role } from "@/lib/domain/member";
import { code, id, instant, name, words } from "./columns";

/** A person in an organisation. `email` is trimmed and lower-cased. */
export class Member extends Model<InferAttributes<Member>, InferCreationAttributes<Member>> {
  declare id: string;
  declare organisationId: string;
  declare name: string;
  declare email: string;
  declare role: Role;
  declare passwordHash: string;
  declare createdAt: Date;

  static bind(sequelize: Sequelize): void {
    this.init(
      {
        id: id({ primaryKey: true }),
        organisationId: id(),
        name: name(),
        email: words(254),
        role: code(),
        passwordHash: words(200),
        createdAt: instant(),
      },
      { sequelize, modelName: "Member", tableName: "members" },
    );
  }
}
