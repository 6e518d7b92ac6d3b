import type { OrganisationKind, Role } from "@/lib/domain/member";

// Fixed ids, so that the demo is known again wherever it stands.
const id = (tail: string) => `d3300000-0000-4000-8000-0000000000${tail}`;

export const organisationIds = { household: id("01"), shop: id("02"), fleet: id("03") };

export const organisations: { id: string; name: string; kind: OrganisationKind }[] = [
  { id: organisationIds.household, name: "Maple Loop household", kind: "household" },
  { id: organisationIds.shop, name: "River Yard hitch shop", kind: "shop" },
  { id: organisationIds.fleet, name: "North Lot rentals", kind: "fleet" },
];

interface DemoMember {
  id: string;
  organisationId: string;
  name: string;
  email: string;
  role: Role;
}

/** The demo's people. A household's first member is its manager, and drives. */
export const members = {
  driver: {
    id: id("11"),
    organisationId: organisationIds.household,
    name: "Robin at Maple Loop",
    email: "driver@demo.example",
    role: "manager",
  },
  installer: {
    id: id("12"),
    organisationId: organisationIds.shop,
    name: "Ada at the river yard",
    email: "installer@demo.example",
    role: "installer",
  },
  manager: {
    id: id("13"),
    organisationId: organisationIds.fleet,
    name: "Ines at the north lot",
    email: "manager@demo.example",
    role: "manager",
  },
  auditor: {
    id: id("14"),
    organisationId: organisationIds.fleet,
    name: "Theo, auditor",
    email: "auditor@demo.example",
    role: "auditor",
  },
  fleetDriver: {
    id: id("15"),
    organisationId: organisationIds.fleet,
    name: "Jo at the north lot",
    email: "fleet-driver@demo.example",
    role: "driver",
  },
} satisfies Record<string, DemoMember>;

export type DemoMemberKey = keyof typeof members;

export const PASSWORD = "walk the rig twice";
