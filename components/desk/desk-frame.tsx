"use client";

import { useQuery } from "@tanstack/react-query";
import Link from "next/link";
import { usePathname } from "next/navigation";
import type { ReactNode } from "react";
import { whoQuery } from "@/lib/client/desk-queries";
import type { Member } from "@/lib/domain/member";
import { deskWords } from "@/lib/domain/messages/desk";
import { rigsWords } from "@/lib/domain/messages/rigs";
import { thingsWords } from "@/lib/domain/messages/things";
import { may } from "@/lib/domain/permissions";
import { SignedIn } from "./signed-in";

/** A desk page: navigation at the side from 1024 px, behind a menu in a top bar below that. */
export function DeskFrame({ children }: { children: ReactNode }) {
  const path = usePathname();
  const { data: member } = useQuery(whoQuery);
  const links = placesFor(member).map(({ href, label, within }) => (
    <NavLink key={href} href={href} label={label} current={currentOf(path, href, within)} />
  ));
  const foot = (
    <div className="mt-auto flex flex-col pt-4">
      {member && may(member.role, "walks.record") && <NavLink href="/field" label={deskWords.field} />}
      {member && <SignedIn member={member} />}
    </div>
  );
  return (
    <div className="min-h-dvh lg:grid lg:grid-cols-[13rem_minmax(0,1fr)] print:block">
      <a
        href="#content"
        className="absolute -top-24 left-2 z-10 border-2 border-ink bg-paper px-4 py-3 font-semibold focus:top-2 print:hidden"
      >
        {deskWords.skip}
      </a>
      {/* A new key per page closes the menu after a choice. */}
      <details key={path} className="border-b-hair border-rule lg:hidden print:hidden">
        <summary className="flex min-h-14 list-none flex-wrap items-center justify-between pl-4 [&::-webkit-details-marker]:hidden">
          <span className="flex min-h-14 items-center text-2xl leading-none font-extrabold">
            {deskWords.brand}
          </span>
          <span className="flex min-h-14 items-center px-4 font-semibold underline decoration-2 underline-offset-4">
            {deskWords.menu}
          </span>
        </summary>
        <nav aria-label={deskWords.nav} className="flex flex-col border-t-hair border-rule px-4 py-2">
          {links}
          {foot}
        </nav>
      </details>
      <nav
        aria-label={deskWords.nav}
        className="sticky top-0 hidden h-dvh flex-col overflow-y-auto border-r-hair border-rule px-4.5 py-5.5 lg:flex print:hidden"
      >
        <Link
          href="/"
          prefetch={false}
          className="mb-4 flex min-h-11 items-center text-2xl leading-none font-extrabold"
        >
          {deskWords.brand}
        </Link>
        {links}
        {foot}
      </nav>
      <main
        id="content"
        tabIndex={-1}
        className="min-w-0 px-4 pt-5 pb-12 outline-none lg:px-7.5 lg:pt-6 print:p-0"
      >
        {/* Pages ask how wide they are, not how wide the window is: large text and the navigation both take room. */}
        <div className="@container max-w-[78rem]">{children}</div>
      </main>
    </div>
  );
}

type Place = { href: string; label: string; within: readonly string[] };

const places: readonly Place[] = [
  { href: "/desk", label: deskWords.history, within: ["/desk/walk"] },
  { href: "/desk/rigs", label: rigsWords.nav, within: ["/desk/rig", "/desk/list", "/desk/sheet"] },
  { href: "/desk/things", label: thingsWords.nav, within: ["/desk/thing"] },
];
const people: Place = { href: "/desk/people", label: deskWords.people, within: [] };

/** Where the desk leads; whoever may invite people has their page too. */
function placesFor(member: Member | undefined): readonly Place[] {
  return member && may(member.role, "people.invite") ? [...places, people] : places;
}

function currentOf(path: string, href: string, within: readonly string[]): "page" | "true" | undefined {
  if (path === href) return "page";
  return within.includes(path) ? "true" : undefined;
}

type NavLinkProps = { href: string; label: string; current?: "page" | "true" };

function NavLink({ href, label, current }: NavLinkProps) {
  return (
    <Link
      href={href}
      prefetch={false}
      aria-current={current}
      className={`-ml-2.5 flex min-h-11 items-center border-l-4 px-2.5 font-semibold hover:underline ${
        current ? "border-now" : "border-transparent"
      }`}
    >
      {label}
    </Link>
  );
}
