import { createHash, randomBytes, randomUUID } from "node:crypto";
import { Op, QueryTypes, type Transaction } from "sequelize";
import {
  INVITATION_DAYS,
  invitedAs,
  type InvitationReading,
  type InvitationRow,
  type Join,
  type MadeInvitation,
  type Person,
} from "@/lib/domain/invitation";
import type { Member, OrganisationKind, Role } from "@/lib/domain/member";
import { Problem } from "@/lib/domain/problem";
import { database, tables } from "../database";
import { hashPassword } from "../password";
import { normalAddress } from "../sign-in";
import { countSignUp } from "../sign-up-limit";
import { inTransaction } from "../transaction";

interface Open {
  id: string;
  role: Role;
  expiresAt: Date;
  by: string;
  organisationId: string;
  organisationName: string;
  kind: OrganisationKind;
}

/** Makes an invitation into the member's organisation, to a role that its kind has. Clears away those that have run out. */
export async function invited(
  { id: memberId, organisation }: Member,
  role: Role,
  now: Date = new Date(),
): Promise<MadeInvitation | Problem> {
  const offered = invitedAs[organisation.kind];
  if (!offered.includes(role)) {
    const detail = `expected one of ${offered.join(", ")}`;
    return new Problem("wrong-shape", { errors: [{ pointer: "/role", detail }] });
  }
  const { Invitation } = tables();
  const token = randomBytes(32).toString("base64url");
  const expiresAt = new Date(now.getTime() + INVITATION_DAYS * 24 * 3_600_000);
  const id = randomUUID();
  await Invitation.destroy({ where: { organisationId: organisation.id, expiresAt: { [Op.lte]: now } } });
  await Invitation.create({
    id,
    organisationId: organisation.id,
    memberId,
    role,
    tokenDigest: digestOfToken(token),
    createdAt: now,
    expiresAt,
  });
  return { id, role, url: `/join?token=${token}`, expiresAt: expiresAt.toISOString() };
}

/** The open invitations of the member's organisation, newest first. */
export async function openInvitations(
  { organisation }: Member,
  now: Date = new Date(),
): Promise<InvitationRow[]> {
  const rows = await found("i.organisation_id = :organisation", { organisation: organisation.id, now });
  return rows.map(({ id, role, by, expiresAt }) => ({ id, role, by, expiresAt: expiresAt.toISOString() }));
}

/** Withdraws an invitation of the member's organisation, or `not-found`. */
export async function withdrawn({ organisation }: Member, id: string): Promise<Problem | null> {
  const count = await tables().Invitation.destroy({ where: { id, organisationId: organisation.id } });
  return count === 0 ? new Problem("not-found") : null;
}

/** What a token invites to. One that is unknown, used, withdrawn or has run out is the same `not-found`. */
export async function invitationOf(
  token: string,
  now: Date = new Date(),
): Promise<InvitationReading | Problem> {
  const [open] = await found("i.token_digest = :digest", { digest: digestOfToken(token), now });
  if (!open) return new Problem("not-found");
  const { role, by, expiresAt, organisationName: name, kind } = open;
  return { organisation: { name, kind }, role, by, expiresAt: expiresAt.toISOString() };
}

/** Makes a member of whoever holds the token, by the rules of a sign-up, and uses the invitation up. */
export async function joined(
  request: Request,
  token: string,
  { name, password, ...body }: Join,
  now: Date = new Date(),
): Promise<Member | Problem> {
  const email = normalAddress(body.email);
  const tooMany = await countSignUp(request, email);
  if (tooMany) return tooMany;
  // Before looking anything up, as in a sign-up.
  const passwordHash = await hashPassword(password);
  return inTransaction(async (transaction): Promise<Member | Problem> => {
    const { Member, Invitation } = tables();
    const digest = digestOfToken(token);
    const [open] = await found("i.token_digest = :digest", { digest, now }, transaction);
    if (!open) return new Problem("not-found");
    if (await Member.findOne({ where: { email }, attributes: ["id"], raw: true, transaction })) {
      return new Problem("address-taken");
    }
    const { role, organisationId, organisationName, kind } = open;
    const member = { id: randomUUID(), name, email, role };
    await Member.create({ ...member, organisationId, passwordHash, createdAt: now }, { transaction });
    await Invitation.destroy({ where: { id: open.id }, transaction });
    return { ...member, organisation: { id: organisationId, name: organisationName, kind } };
  });
}

/** The members of one's organisation, by name. */
export async function people({ organisation }: Member): Promise<Person[]> {
  return tables().Member.findAll({
    where: { organisationId: organisation.id },
    attributes: ["id", "name", "role"],
    order: ["name", "id"],
    raw: true,
  });
}

/** Invitations that have not run out; within a transaction held until its end, so that each is used once. */
async function found(
  where: string,
  replacements: Record<string, unknown>,
  transaction?: Transaction,
): Promise<Open[]> {
  return database().query<Open>(
    `SELECT i.id, i.role, i.expires_at AS expiresAt, m.name AS \`by\`,
        o.id AS organisationId, o.name AS organisationName, o.kind
      FROM invitations i
      JOIN members m ON m.id = i.member_id
      JOIN organisations o ON o.id = i.organisation_id
      WHERE ${where} AND i.expires_at > :now
      ORDER BY i.created_at DESC, i.id ${transaction ? "FOR UPDATE" : ""}`,
    { type: QueryTypes.SELECT, replacements, transaction },
  );
}

function digestOfToken(token: string): Buffer {
  return createHash("sha256").update(token).digest();
}
