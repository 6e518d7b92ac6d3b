import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from "sequelize";
import type { PhotoMime } from "@/lib/domain/photo";
import { code, count, digest, id, instant } from "./columns";

/** The bytes of a photograph that an organisation's phone has sent; the bytes themselves are in the photo store. */
export class PhotoObject extends Model<InferAttributes<PhotoObject>, InferCreationAttributes<PhotoObject>> {
  declare organisationId: string;
  declare sha256: Buffer;
  declare bytes: number;
  declare mime: PhotoMime;
  declare storedAt: Date;

  static bind(sequelize: Sequelize): void {
    this.init(
      {
        organisationId: id({ primaryKey: true }),
        sha256: { ...digest({ primaryKey: true }), field: "sha256" },
        bytes: count(),
        mime: code(),
        storedAt: instant(),
      },
      { sequelize, modelName: "PhotoObject", tableName: "photo_objects" },
    );
  }
}
