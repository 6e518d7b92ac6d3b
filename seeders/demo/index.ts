import { digestOf } from "@/lib/domain/digest";
import type { BundleRig } from "@/lib/domain/field";
import { canonicalText } from "@/lib/domain/json";
import type { Member } from "@/lib/domain/member";
import { Problem } from "@/lib/domain/problem";
import { tables } from "@/lib/server/database";
import { deviceRegistered } from "@/lib/server/devices";
import { ingest } from "@/lib/server/ingest/ingest";
import { hashPassword } from "@/lib/server/password";
import { inTransaction } from "@/lib/server/transaction";
import { members, organisations, PASSWORD, type DemoMemberKey } from "./people";
import { rigs } from "./rigs";
import { DemoPhone } from "./walk-maker";
import { demoWalks } from "./walks";

/**
 * Seeds the demo: people, rigs and signed walks of the weeks before `now`, all invented. Where it stands already
 * nothing happens; one that was cut short is completed.
 */
export async function seedDemo(now: Date = new Date()): Promise<void> {
  await seedPeopleAndRigs(now);
  await keepListsCurrent(now);
  const today = new Date(now.toISOString().slice(0, 10));
  for (const key of Object.keys(members) as DemoMemberKey[]) await seedWalks(key, today);
}

async function seedPeopleAndRigs(now: Date): Promise<void> {
  const { Organisation, Member, Rig } = tables();
  const passwordHash = await hashPassword(PASSWORD);
  const createdAt = longBefore(now);
  await inTransaction(async (transaction) => {
    if (await Organisation.findByPk(organisations[0]!.id, { attributes: ["id"], raw: true, transaction }))
      return;
    await Organisation.bulkCreate(organisations, { transaction });
    await Member.bulkCreate(
      Object.values(members).map((member) => ({ ...member, passwordHash, createdAt })),
      { transaction },
    );
    const all = Object.values(rigs);
    await Rig.bulkCreate(
      all.map(({ id, name, keeperId, builderId }) => ({ id, name, keeperId, builderId, createdAt })),
      { transaction },
    );
  });
}

/** Issues a rig's list where it has none yet, or anew where a demo that stands already has an older one. */
async function keepListsCurrent(now: Date): Promise<void> {
  const { Revision } = tables();
  for (const { id: rigId, revisionId, document } of Object.values(rigs)) {
    const digest = Buffer.from(digestOf(document), "hex");
    const latest = await Revision.findOne({
      attributes: ["number", "digest"],
      where: { rigId },
      order: [["number", "DESC"]],
      raw: true,
    });
    if (latest && digest.equals(latest.digest)) continue;
    await Revision.create({
      id: latest ? crypto.randomUUID() : revisionId,
      rigId,
      number: (latest?.number ?? 0) + 1,
      digest,
      document: Buffer.from(canonicalText(document)),
      createdAt: latest ? now : longBefore(now),
    });
  }
}

/** Long before the first walk, so that the history makes sense. */
function longBefore(now: Date): Date {
  return new Date(now.getTime() - 60 * 24 * 3_600_000);
}

async function seedWalks(key: DemoMemberKey, today: Date): Promise<void> {
  const { Walk } = tables();
  const walks = demoWalks.filter((walk) => walk.member === key);
  const missing = walks.slice(await Walk.count({ where: { memberId: members[key].id } }));
  if (missing.length === 0) return;
  const member = demoMember(key);
  const phone = await DemoPhone.of(member.id);
  const registered = await deviceRegistered(member, phone.registration());
  if (registered instanceof Problem) throw new Error(`the demo's device: ${registered.code}`);
  for (const walk of missing) {
    const { envelope, sentAt } = await phone.walk(bundleRig(walk.rig), walk, today);
    const { refused } = await ingest(member, envelope, sentAt);
    if (refused[0]) throw new Error(`the demo's walk: ${refused[0].code} ${refused[0].detail}`);
  }
}

function demoMember(key: DemoMemberKey): Member {
  const { organisationId, ...member } = members[key];
  return { ...member, organisation: organisations.find(({ id }) => id === organisationId)! };
}

function bundleRig(key: keyof typeof rigs): BundleRig {
  const { id, name, revisionId, document } = rigs[key];
  const revision = { id: revisionId, digest: digestOf(document), document };
  return { id, name, revision, openFindings: [], lastWalk: null };
}
