import { digestOf } from "@/lib/domain/digest";
import type { BundleRig } from "@/lib/domain/field";
import type { Member } from "@/lib/domain/member";
import { may } from "@/lib/domain/permissions";
import { Problem } from "@/lib/domain/problem";
import { tables } from "@/lib/server/database";
import { deviceRegistered } from "@/lib/server/devices";
import { ingest } from "@/lib/server/ingest/ingest";
import { hashPassword } from "@/lib/server/password";
import { composed, storeRevision } from "@/lib/server/rigs/store-revision";
import { claimThings } from "@/lib/server/things/recording";
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

/** Saves a rig's sheet where it has none yet, or anew where a demo that stands already has an older list. */
async function keepListsCurrent(now: Date): Promise<void> {
  const { Revision } = tables();
  for (const { id: rigId, keeperId, sheet } of Object.values(rigs)) {
    const revision = composed(sheet);
    await inTransaction(async (transaction) => {
      const latest = await Revision.findOne({
        attributes: ["number", "digest"],
        where: { rigId },
        order: [["number", "DESC"]],
        raw: true,
        transaction,
      });
      if (latest?.digest.toString("hex") === revision.digest) return;
      const author = { member: writerOf(keeperId), now: latest ? now : longBefore(now), transaction };
      const faults = await claimThings(author, rigId, sheet);
      if (faults[0]) throw new Error(`the demo's sheet: ${faults[0].pointer} ${faults[0].detail}`);
      await storeRevision(author, rigId, (latest?.number ?? 0) + 1, revision);
    });
  }
}

/** Who filled in the sheets of a keeper's rigs. */
function writerOf(keeperId: string): Member {
  const keys = Object.keys(members) as DemoMemberKey[];
  const writer = keys.find(
    (key) => members[key].organisationId === keeperId && may(members[key].role, "rigs.write"),
  );
  return demoMember(writer!);
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
  const { id, name, document } = rigs[key];
  const revision = { id, digest: digestOf(document), document };
  return { id, name, revision, openFindings: [], lastWalk: null };
}
