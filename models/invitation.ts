import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from "sequelize";
import type { Role } from "@/lib/domain/member";
import { code, digest, id, instant } from "./columns";

/** An open invitation. `tokenDigest` is the SHA-256 of the token, which only the link has; `memberId` made it. */
export class Invitation extends Model<InferAttributes<Invitation>, InferCreationAttributes<Invitation>> {
  declare id: string;
  declare organisationId: string;
  declare memberId: string;
  declare role: Role;
  declare tokenDigest: Buffer;
  declare createdAt: Date;
  declare expiresAt: Date;

  static bind(sequelize: Sequelize): void {
    this.init(
      {
        id: id({ primaryKey: true }),
        organisationId: id(),
        memberId: id(),
        role: code(),
        tokenDigest: digest(),
        createdAt: instant(),
        expiresAt: instant(),
      },
      { sequelize, modelName: "Invitation", tableName: "invitations" },
    );
  }
}
