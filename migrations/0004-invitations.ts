import type { QueryInterface } from "sequelize";

const ID = "CHAR(36) CHARACTER SET ascii COLLATE ascii_bin";
const CODE = "VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin";
const TABLE = "ENGINE=InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin";

/** Invitations that are open; one that was used or withdrawn is gone. */
export async function up({ context }: { context: QueryInterface }): Promise<void> {
  await context.sequelize.query(`CREATE TABLE invitations (
    id ${ID} NOT NULL,
    organisation_id ${ID} NOT NULL,
    member_id ${ID} NOT NULL,
    role ${CODE} NOT NULL,
    token_digest BINARY(32) NOT NULL,
    created_at DATETIME(3) NOT NULL,
    expires_at DATETIME(3) NOT NULL,
    PRIMARY KEY (id),
    UNIQUE KEY invitations_token (token_digest),
    KEY invitations_organisation (organisation_id, created_at),
    CONSTRAINT invitations_organisation FOREIGN KEY (organisation_id) REFERENCES organisations (id),
    CONSTRAINT invitations_member FOREIGN KEY (member_id) REFERENCES members (id)
  ) ${TABLE}`);
}

export async function down({ context }: { context: QueryInterface }): Promise<void> {
  await context.sequelize.query("DROP TABLE invitations");
}
