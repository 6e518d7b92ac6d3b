import "server-only";
import { createHash } from "node:crypto";
import type { Adapter, DatabaseSession, DatabaseUser } from "lucia";
import { Op } from "sequelize";
import { tables } from "./database";

/**
 * Where lucia keeps sessions: only the SHA-256 of a session id is stored, so that a copy of the database signs nobody
 * in. Sessions go back to lucia under the id that was presented; under the digest, renewing would hash it again.
 */
export const sessionAdapter: Adapter = {
  async getSessionAndUser(sessionId) {
    const { Session, Member, Organisation } = tables();
    const row = (await Session.findOne({
      where: { id: digestOfId(sessionId) },
      attributes: ["memberId", "expiresAt"],
      include: {
        model: Member,
        as: "member",
        attributes: ["name", "email", "role"],
        include: [{ model: Organisation, as: "organisation", attributes: ["id", "name", "kind"] }],
      },
      raw: true,
      nest: true,
    })) as unknown as {
      memberId: string;
      expiresAt: Date;
      member: DatabaseUser["attributes"];
    } | null;
    if (!row) return [null, null];
    const { memberId, expiresAt, member } = row;
    return [
      { id: sessionId, userId: memberId, expiresAt, attributes: {} },
      { id: memberId, attributes: member },
    ];
  },

  // The ids are digests here: nobody could sign in with them.
  async getUserSessions(memberId) {
    const { Session } = tables();
    const rows = await Session.findAll({
      where: { memberId },
      attributes: ["id", "expiresAt"],
      raw: true,
    });
    return rows.map(({ id, expiresAt }): DatabaseSession => ({
      id: id.toString("hex"),
      userId: memberId,
      expiresAt,
      attributes: {},
    }));
  },

  async setSession({ id, userId, expiresAt }) {
    const { Session } = tables();
    await Session.create({ id: digestOfId(id), memberId: userId, expiresAt });
  },

  async updateSessionExpiration(sessionId, expiresAt) {
    const { Session } = tables();
    await Session.update({ expiresAt }, { where: { id: digestOfId(sessionId) } });
  },

  async deleteSession(sessionId) {
    const { Session } = tables();
    await Session.destroy({ where: { id: digestOfId(sessionId) } });
  },

  async deleteUserSessions(memberId) {
    const { Session } = tables();
    await Session.destroy({ where: { memberId } });
  },

  async deleteExpiredSessions() {
    const { Session } = tables();
    await Session.destroy({ where: { expiresAt: { [Op.lt]: new Date() } } });
  },
};

function digestOfId(sessionId: string): Buffer {
  return createHash("sha256").update(sessionId).digest();
}
