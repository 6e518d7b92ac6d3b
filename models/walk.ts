import {
  DataTypes,
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from "sequelize";
import type { Depth, Purpose, Verdict } from "@/lib/domain/entry";
import type { Algorithm } from "@/lib/domain/signature";
import { code, count, digest, id, instant, words } from "./columns";

/**
 * Where one walk stands. What its entries add up to (verdict, counts, head) is kept here too, so that lists need not
 * replay; the entries are the truth.
 */
export class Walk extends Model<InferAttributes<Walk>, InferCreationAttributes<Walk>> {
  declare id: string;
  declare rigId: string;
  declare revisionId: string;
  declare memberId: string;
  /** The organisation of the member when the walk came. */
  declare organisationId: string;
  /** The device that opened it: only that one adds to it. */
  declare deviceId: string;
  declare purpose: Purpose;
  declare depth: Depth;
  declare source: "paper" | null;
  /** By the phone's clock. */
  declare openedAt: Date;
  /** When the first entry came, by the server's clock. */
  declare receivedAt: Date;
  /** The earlier of both: a phone whose clock is ahead cannot stay on top of every list. */
  declare sortAt: Date;
  declare state: "open" | "sealed";
  declare closed: boolean;
  declare verdict: Verdict;
  /** The verdict that the phone closed with, where the server's replay differs. */
  declare closedAs: Verdict | null;
  declare marks: number;
  declare faults: number;
  /** How many entries are stored, contiguous from 0. */
  declare entries: number;
  declare elapsedMs: number;
  /** Digest of the last entry; of a sealed walk, the seal. */
  declare head: Buffer;
  declare sealedAt: Date | null;
  declare sealAlg: Algorithm | null;
  declare sealSignature: string | null;
  declare sealDeviceId: string | null;
  /** Canonical text of the receipt, so that it is answered the same for ever. */
  declare receipt: string | null;

  static bind(sequelize: Sequelize): void {
    this.init(
      {
        id: id({ primaryKey: true }),
        rigId: id(),
        revisionId: id(),
        memberId: id(),
        organisationId: id(),
        deviceId: id(),
        purpose: code(),
        depth: code(),
        source: code({ allowNull: true }),
        openedAt: instant(),
        receivedAt: instant(),
        sortAt: instant(),
        state: code(),
        closed: { type: DataTypes.BOOLEAN, allowNull: false },
        verdict: code(),
        closedAs: code({ allowNull: true }),
        marks: count(),
        faults: count(),
        entries: count(),
        elapsedMs: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
        head: digest(),
        sealedAt: instant({ allowNull: true }),
        sealAlg: code({ allowNull: true }),
        sealSignature: words(200, { allowNull: true }),
        sealDeviceId: id({ allowNull: true }),
        receipt: { type: DataTypes.TEXT, allowNull: true },
      },
      { sequelize, modelName: "Walk", tableName: "walks" },
    );
  }
}
