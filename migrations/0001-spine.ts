import type { QueryInterface } from "sequelize";

// Ids and digests compare as bytes; words sort as people expect them to.
const ID = "CHAR(36) CHARACTER SET ascii COLLATE ascii_bin";
const CODE = "VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin";
const THUMBPRINT = "CHAR(43) CHARACTER SET ascii COLLATE ascii_bin";
const TABLE = "ENGINE=InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci";

const tables = [
  `CREATE TABLE organisations (
    id ${ID} NOT NULL,
    name VARCHAR(100) NOT NULL,
    kind ${CODE} NOT NULL,
    PRIMARY KEY (id)
  ) ${TABLE}`,

  `CREATE TABLE members (
    id ${ID} NOT NULL,
    organisation_id ${ID} NOT NULL,
    name VARCHAR(100) NOT NULL,
    email VARCHAR(254) COLLATE utf8mb4_bin NOT NULL,
    role ${CODE} NOT NULL,
    password_hash VARCHAR(200) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    created_at DATETIME(3) NOT NULL,
    PRIMARY KEY (id),
    UNIQUE KEY members_email (email),
    CONSTRAINT members_organisation FOREIGN KEY (organisation_id) REFERENCES organisations (id)
  ) ${TABLE}`,

  `CREATE TABLE sessions (
    id BINARY(32) NOT NULL,
    member_id ${ID} NOT NULL,
    expires_at DATETIME(3) NOT NULL,
    PRIMARY KEY (id),
    KEY sessions_expires_at (expires_at),
    CONSTRAINT sessions_member FOREIGN KEY (member_id) REFERENCES members (id) ON DELETE CASCADE
  ) ${TABLE}`,

  `CREATE TABLE devices (
    id ${ID} NOT NULL,
    member_id ${ID} NOT NULL,
    alg ${CODE} NOT NULL,
    thumbprint ${THUMBPRINT} NOT NULL,
    public_key TEXT CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    label VARCHAR(100) NOT NULL,
    created_at DATETIME(3) NOT NULL,
    PRIMARY KEY (id),
    CONSTRAINT devices_member FOREIGN KEY (member_id) REFERENCES members (id)
  ) ${TABLE}`,

  `CREATE TABLE rigs (
    id ${ID} NOT NULL,
    name VARCHAR(100) NOT NULL,
    keeper_id ${ID} NOT NULL,
    builder_id ${ID} NULL,
    created_at DATETIME(3) NOT NULL,
    PRIMARY KEY (id),
    KEY rigs_keeper (keeper_id, name, id),
    CONSTRAINT rigs_keeper FOREIGN KEY (keeper_id) REFERENCES organisations (id),
    CONSTRAINT rigs_builder FOREIGN KEY (builder_id) REFERENCES organisations (id)
  ) ${TABLE}`,

  `CREATE TABLE revisions (
    id ${ID} NOT NULL,
    rig_id ${ID} NOT NULL,
    number INT UNSIGNED NOT NULL,
    digest BINARY(32) NOT NULL,
    document MEDIUMBLOB NOT NULL,
    created_at DATETIME(3) NOT NULL,
    PRIMARY KEY (id),
    UNIQUE KEY revisions_digest (rig_id, digest),
    UNIQUE KEY revisions_number (rig_id, number),
    CONSTRAINT revisions_rig FOREIGN KEY (rig_id) REFERENCES rigs (id)
  ) ${TABLE}`,

  `CREATE TABLE walks (
    id ${ID} NOT NULL,
    rig_id ${ID} NOT NULL,
    revision_id ${ID} NOT NULL,
    member_id ${ID} NOT NULL,
    organisation_id ${ID} NOT NULL,
    device_id ${ID} NOT NULL,
    purpose ${CODE} NOT NULL,
    depth ${CODE} NOT NULL,
    source ${CODE} NULL,
    opened_at DATETIME(3) NOT NULL,
    received_at DATETIME(3) NOT NULL,
    sort_at DATETIME(3) NOT NULL,
    state ${CODE} NOT NULL,
    closed BOOLEAN NOT NULL,
    verdict ${CODE} NOT NULL,
    closed_as ${CODE} NULL,
    marks INT UNSIGNED NOT NULL,
    faults INT UNSIGNED NOT NULL,
    entries INT UNSIGNED NOT NULL,
    elapsed_ms BIGINT UNSIGNED NOT NULL,
    head BINARY(32) NOT NULL,
    sealed_at DATETIME(3) NULL,
    seal_alg ${CODE} NULL,
    seal_signature VARCHAR(200) CHARACTER SET ascii COLLATE ascii_bin NULL,
    seal_device_id ${ID} NULL,
    receipt TEXT CHARACTER SET ascii COLLATE ascii_bin NULL,
    PRIMARY KEY (id),
    KEY walks_organisation (organisation_id, sort_at, id),
    KEY walks_rig (rig_id, sort_at, id),
    KEY walks_member (member_id, sort_at, id),
    KEY walks_rig_organisation (rig_id, organisation_id, sort_at, id),
    KEY walks_rig_sealed (rig_id, state, sort_at, id),
    CONSTRAINT walks_rig FOREIGN KEY (rig_id) REFERENCES rigs (id),
    CONSTRAINT walks_revision FOREIGN KEY (revision_id) REFERENCES revisions (id),
    CONSTRAINT walks_member FOREIGN KEY (member_id) REFERENCES members (id),
    CONSTRAINT walks_organisation FOREIGN KEY (organisation_id) REFERENCES organisations (id),
    CONSTRAINT walks_device FOREIGN KEY (device_id) REFERENCES devices (id),
    CONSTRAINT walks_seal_device FOREIGN KEY (seal_device_id) REFERENCES devices (id)
  ) ${TABLE}`,

  `CREATE TABLE entries (
    walk_id ${ID} NOT NULL,
    seq INT UNSIGNED NOT NULL,
    digest BINARY(32) NOT NULL,
    bytes MEDIUMBLOB NOT NULL,
    received_at DATETIME(3) NOT NULL,
    PRIMARY KEY (walk_id, seq),
    CONSTRAINT entries_walk FOREIGN KEY (walk_id) REFERENCES walks (id)
  ) ${TABLE}`,

  `CREATE TABLE forks (
    walk_id ${ID} NOT NULL,
    seq INT UNSIGNED NOT NULL,
    digest BINARY(32) NOT NULL,
    bytes MEDIUMBLOB NOT NULL,
    device_id ${ID} NOT NULL,
    member_id ${ID} NOT NULL,
    received_at DATETIME(3) NOT NULL,
    PRIMARY KEY (walk_id, seq, digest),
    CONSTRAINT forks_walk FOREIGN KEY (walk_id) REFERENCES walks (id),
    CONSTRAINT forks_device FOREIGN KEY (device_id) REFERENCES devices (id),
    CONSTRAINT forks_member FOREIGN KEY (member_id) REFERENCES members (id)
  ) ${TABLE}`,
];

/** Organisations and their members, rigs and their revisions, and the record of walks. */
export async function up({ context }: { context: QueryInterface }): Promise<void> {
  for (const sql of tables) await context.sequelize.query(sql);
}

export async function down({ context }: { context: QueryInterface }): Promise<void> {
  const names = ["forks", "entries", "walks", "revisions", "rigs", "devices", "sessions", "members"];
  for (const name of [...names, "organisations"]) await context.sequelize.query(`DROP TABLE ${name}`);
}
