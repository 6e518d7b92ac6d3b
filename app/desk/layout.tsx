import type { ReactNode } from "react";
import { DeskRoom } from "@/components/desk/desk-room";

export default function DeskLayout({ children }: { children: ReactNode }) {
  return <DeskRoom>{children}</DeskRoom>;
}
