import "server-only";
import { randomUUID } from "node:crypto";
import type { Transaction } from "sequelize";
import { digestOf } from "@/lib/domain/digest";
import { canonicalText, findJsonFault } from "@/lib/domain/json";
import type { Member } from "@/lib/domain/member";
import { Problem, type FieldError } from "@/lib/domain/problem";
import type { SignUp } from "@/lib/domain/sign-up";
import { tables } from "./database";
import { hashPassword } from "./password";
import { normalAddress } from "./sign-in";
import { countSignUp } from "./sign-up-limit";
import { inTransaction } from "./transaction";

interface NewRig {
  id: string;
  name: string;
  /** As received: the digest that walks name is taken of it. */
  document: unknown;
}

/**
 * Makes a household, its manager and the rigs that came along, all or nothing. Ids that a phone made are taken as they
 * are: they are random and have not left it, so that only their maker knows them, and one that exists is refused.
 * @param raw the body as received
 */
export async function signedUp(request: Request, body: SignUp, raw: unknown): Promise<Member | Problem> {
  const email = normalAddress(body.email);
  const tooMany = await countSignUp(request, email);
  if (tooMany) return tooMany;
  const rigs = rigsOf(body, raw);
  if (rigs instanceof Problem) return rigs;
  // Before looking anything up: a taken address costs the same time as a free one.
  const passwordHash = await hashPassword(body.password);
  const organisation = { id: randomUUID(), name: body.household, kind: "household" } as const;
  const id = body.member ?? randomUUID();
  const member: Member = { id, name: body.name, email, role: "manager", organisation };
  return inTransaction(async (transaction) => {
    const taken = await whatIsTaken(member, rigs, transaction);
    if (taken) return taken;
    await store(member, passwordHash, rigs, transaction);
    return member;
  });
}

function rigsOf({ rigs = [] }: SignUp, raw: unknown): NewRig[] | Problem {
  const received = (raw as { rigs?: { document: unknown }[] }).rigs ?? [];
  const whole = rigs.map(({ id, name }, at) => ({ id, name, document: received[at]!.document }));
  const errors = whole.flatMap(({ document }, at): FieldError[] => {
    const fault = findJsonFault(document, `/rigs/${at}/document`);
    return fault ? [fault] : [];
  });
  return errors.length > 0 ? new Problem("wrong-shape", { errors }) : whole;
}

async function whatIsTaken(
  { id, email }: Member,
  rigs: readonly NewRig[],
  transaction: Transaction,
): Promise<Problem | null> {
  const { Member, Rig } = tables();
  const one = { attributes: ["id"], raw: true, transaction };
  if (await Member.findOne({ where: { email }, ...one })) return new Problem("address-taken");
  const pointers = (await Member.findByPk(id, one)) ? ["/member"] : [];
  const stored = await Rig.findAll({ where: { id: rigs.map((rig) => rig.id) }, ...one });
  for (const { id: known } of stored) {
    pointers.push(`/rigs/${rigs.findIndex((rig) => rig.id === known)}/id`);
  }
  if (pointers.length === 0) return null;
  return new Problem("id-taken", {
    errors: pointers.map((pointer) => ({ pointer, detail: "exists already" })),
  });
}

async function store(
  { organisation, ...member }: Member,
  passwordHash: string,
  rigs: readonly NewRig[],
  transaction: Transaction,
): Promise<void> {
  const { Organisation, Member, Rig, Revision } = tables();
  const createdAt = new Date();
  const keeperId = organisation.id;
  await Organisation.create(organisation, { transaction });
  await Member.create({ ...member, organisationId: keeperId, passwordHash, createdAt }, { transaction });
  await Rig.bulkCreate(
    rigs.map(({ id, name }) => ({ id, name, keeperId, builderId: null, createdAt })),
    { transaction },
  );
  await Revision.bulkCreate(
    rigs.map(({ id, document }) => ({
      id: randomUUID(),
      rigId: id,
      number: 1,
      digest: Buffer.from(digestOf(document), "hex"),
      document: Buffer.from(canonicalText(document)),
      createdAt,
    })),
    { transaction },
  );
}
