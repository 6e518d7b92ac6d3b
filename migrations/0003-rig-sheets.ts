import type { QueryInterface } from "sequelize";

const ID = "CHAR(36) CHARACTER SET ascii COLLATE ascii_bin";
const CODE = "VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin";
const TABLE = "ENGINE=InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin";

const steps = [
  // Someone who goes back to an earlier sheet makes a new revision with an earlier one's digest. What a digest stands
  // for is the same in each, so whoever looks one up may take any.
  `ALTER TABLE revisions
    ADD COLUMN member_id ${ID} NULL AFTER number,
    ADD CONSTRAINT revisions_member FOREIGN KEY (member_id) REFERENCES members (id),
    DROP KEY revisions_digest,
    ADD KEY revisions_digest (rig_id, digest, number)`,

  `CREATE TABLE things (
    id ${ID} NOT NULL,
    organisation_id ${ID} NOT NULL,
    kind ${CODE} NOT NULL,
    created_at DATETIME(3) NOT NULL,
    PRIMARY KEY (id),
    KEY things_organisation (organisation_id, kind, created_at, id),
    CONSTRAINT things_organisation FOREIGN KEY (organisation_id) REFERENCES organisations (id)
  ) ${TABLE}`,

  // A row where a revision says something else of a thing than the rig's revision before it. A thing that left keeps
  // what was last said of it.
  `CREATE TABLE thing_states (
    thing_id ${ID} NOT NULL,
    rig_id ${ID} NOT NULL,
    number INT UNSIGNED NOT NULL,
    present BOOLEAN NOT NULL,
    body MEDIUMBLOB NOT NULL,
    PRIMARY KEY (thing_id, rig_id, number),
    KEY thing_states_revision (rig_id, number),
    CONSTRAINT thing_states_thing FOREIGN KEY (thing_id) REFERENCES things (id),
    CONSTRAINT thing_states_revision FOREIGN KEY (rig_id, number) REFERENCES revisions (rig_id, number)
  ) ${TABLE}`,

  `CREATE TABLE sheet_photos (
    rig_id ${ID} NOT NULL,
    number INT UNSIGNED NOT NULL,
    sha256 BINARY(32) NOT NULL,
    organisation_id ${ID} NOT NULL,
    bytes BIGINT UNSIGNED NOT NULL,
    mime VARCHAR(100) NOT NULL,
    PRIMARY KEY (rig_id, number, sha256),
    KEY sheet_photos_sha256 (sha256, organisation_id, rig_id, number),
    CONSTRAINT sheet_photos_revision FOREIGN KEY (rig_id, number) REFERENCES revisions (rig_id, number),
    CONSTRAINT sheet_photos_organisation FOREIGN KEY (organisation_id) REFERENCES organisations (id)
  ) ${TABLE}`,
];

/** Who saved a revision, revisions that go back, the histories of coach, car and gear, and what sheets show. */
export async function up({ context }: { context: QueryInterface }): Promise<void> {
  for (const sql of steps) await context.sequelize.query(sql);
}

const FIRST = `SELECT rig_id, digest, MIN(number) AS number FROM revisions GROUP BY rig_id, digest`;

const stepsBack = [
  "DROP TABLE sheet_photos",
  "DROP TABLE thing_states",
  "DROP TABLE things",
  // A digest stands once for each rig again, and its walks on the first revision that had it.
  `UPDATE walks w JOIN revisions v ON v.id = w.revision_id
    JOIN (${FIRST}) AS f ON f.rig_id = v.rig_id AND f.digest = v.digest
    JOIN revisions kept ON kept.rig_id = f.rig_id AND kept.number = f.number
    SET w.revision_id = kept.id`,
  `DELETE v FROM revisions v JOIN (${FIRST}) AS f ON f.rig_id = v.rig_id AND f.digest = v.digest
    WHERE v.number > f.number`,
  `ALTER TABLE revisions
    DROP FOREIGN KEY revisions_member,
    DROP KEY revisions_member,
    DROP COLUMN member_id,
    DROP KEY revisions_digest,
    ADD UNIQUE KEY revisions_digest (rig_id, digest)`,
];

export async function down({ context }: { context: QueryInterface }): Promise<void> {
  for (const sql of stepsBack) await context.sequelize.query(sql);
}
