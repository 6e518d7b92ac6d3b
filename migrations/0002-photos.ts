import { QueryTypes, type QueryInterface } from "sequelize";

const ID = "CHAR(36) CHARACTER SET ascii COLLATE ascii_bin";
const CODE = "VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin";
const TABLE = "ENGINE=InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin";

const tables = [
  `CREATE TABLE photo_entries (
    walk_id ${ID} NOT NULL,
    seq INT UNSIGNED NOT NULL,
    check_key VARCHAR(100) NULL,
    sha256 BINARY(32) NOT NULL,
    bytes BIGINT UNSIGNED NOT NULL,
    mime VARCHAR(100) NOT NULL,
    PRIMARY KEY (walk_id, seq),
    KEY photo_entries_sha256 (sha256, walk_id),
    CONSTRAINT photo_entries_walk FOREIGN KEY (walk_id) REFERENCES walks (id)
  ) ${TABLE}`,

  `CREATE TABLE photo_objects (
    organisation_id ${ID} NOT NULL,
    sha256 BINARY(32) NOT NULL,
    bytes INT UNSIGNED NOT NULL,
    mime ${CODE} NOT NULL,
    stored_at DATETIME(3) NOT NULL,
    PRIMARY KEY (organisation_id, sha256),
    CONSTRAINT photo_objects_organisation FOREIGN KEY (organisation_id) REFERENCES organisations (id)
  ) ${TABLE}`,
];

type Photo = {
  walk: string;
  seq: number;
  body: { check?: string; sha256: string; bytes: number; mime: string };
};

/** The photographs that entries name, found by their digest, and the bytes that each organisation has sent. */
export async function up({ context }: { context: QueryInterface }): Promise<void> {
  for (const sql of tables) await context.sequelize.query(sql);
  // Hookfast's own phone took no photographs before this, but the entry was open to anyone who writes the format.
  const stored = await context.sequelize.query<{ bytes: Buffer }>(
    `SELECT bytes FROM entries WHERE bytes LIKE '%"type":"photo"%'`,
    { type: QueryTypes.SELECT },
  );
  const rows = stored
    .map(({ bytes }) => JSON.parse(bytes.toString("utf8")) as { type: string } & Photo)
    .filter(({ type }) => type === "photo")
    .map(({ walk, seq, body }) => ({
      walk_id: walk,
      seq,
      check_key: body.check ?? null,
      sha256: Buffer.from(body.sha256, "hex"),
      bytes: body.bytes,
      mime: body.mime,
    }));
  if (rows.length > 0) await context.bulkInsert("photo_entries", rows);
}

export async function down({ context }: { context: QueryInterface }): Promise<void> {
  for (const name of ["photo_objects", "photo_entries"]) await context.sequelize.query(`DROP TABLE ${name}`);
}
