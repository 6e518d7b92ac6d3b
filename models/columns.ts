import { DataTypes, type DataType } from "sequelize";

type Extra = { primaryKey?: true; allowNull?: boolean };

// A new object each time: Sequelize writes the column's name into the one that it is given.
function column(type: DataType, extra: Extra) {
  return { type, allowNull: false, ...extra };
}

/** Text that compares as bytes: an id. */
export const id = (extra: Extra = {}) => column(DataTypes.CHAR(36), extra);

/** A short code out of a closed list. */
export const code = (extra: Extra = {}) => column(DataTypes.STRING(20), extra);

/** A SHA-256 digest as 32 bytes. Sequelize has no type for BINARY; a column type as text passes Buffers through. */
export const digest = (extra: Extra = {}) => column("BINARY(32)", extra);

/** An instant with its milliseconds, which a plain DATE would drop. */
export const instant = (extra: Extra = {}) => column(DataTypes.DATE(3), extra);

export const count = (extra: Extra = {}) => column(DataTypes.INTEGER.UNSIGNED, extra);
/** A whole number up to 2^53-1. */
export const largeCount = () => column(DataTypes.BIGINT.UNSIGNED, {});
export const words = (length: number, extra: Extra = {}) => column(DataTypes.STRING(length), extra);
export const name = () => words(100);

/** Canonical JSON as its exact bytes; a JSON column would rewrite them. */
export const canonicalBytes = () => column(DataTypes.BLOB("medium"), {});
