import { createHash } from 'node:crypto';
import type { Adapter, DatabaseSession, DatabaseUser } from 'lucia';
import { Op } from 'sequelize';
import { Session } from '#server/models/session.ts';
import type { User } from '#server/models/user.ts';

/** What the database keeps of a session id: who reads the table cannot sign in with what he finds. */
export const hashSessionId = (sessionId: string) => createHash('sha256').update(sessionId).digest('hex');

const asDatabaseSession = (row: Session, id: string): DatabaseSession => ({
  id,
  userId: row.userId,
  expiresAt: row.expiresAt,
  attributes: { device: row.device, lastUsedAt: row.lastUsedAt },
});

const asDatabaseUser = (row: User): DatabaseUser => ({
  id: row.id,
  attributes: { name: row.name, email: row.email, role: row.role },
});

/** Keeps lucia's sessions through Sequelize, by the hash of their id. */
export const sessionAdapter: Adapter = {
  async getSessionAndUser(sessionId) {
    const row = await Session.findByPk(hashSessionId(sessionId), { include: 'user' });
    if (!row?.user) return [null, null];
    return [asDatabaseSession(row, sessionId), asDatabaseUser(row.user)];
  },

  /** Their ids are known to the browsers only; here they go by their hash. */
  async getUserSessions(userId) {
    const rows = await Session.findAll({ where: { userId } });
    return rows.map((row) => asDatabaseSession(row, row.idHash));
  },

  async setSession(session) {
    await Session.create({
      idHash: hashSessionId(session.id),
      userId: session.userId,
      expiresAt: session.expiresAt,
      device: session.attributes.device,
      lastUsedAt: session.attributes.lastUsedAt,
    });
  },

  async updateSessionExpiration(sessionId, expiresAt) {
    await Session.update({ expiresAt }, { where: { idHash: hashSessionId(sessionId) } });
  },

  async deleteSession(sessionId) {
    await Session.destroy({ where: { idHash: hashSessionId(sessionId) } });
  },

  async deleteUserSessions(userId) {
    await Session.destroy({ where: { userId } });
  },

  async deleteExpiredSessions() {
    await Session.destroy({ where: { expiresAt: { [Op.lte]: new Date() } } });
  },
};

/** Notes that a session is in use. */
export async function touchSession(sessionId: string): Promise<void> {
  await Session.update({ lastUsedAt: new Date() }, { where: { idHash: hashSessionId(sessionId) } });
}
