import type { Member } from "@/lib/domain/member";
import type { PublicKey } from "@/lib/domain/signature";

/** Who sends an envelope, and from which device. */
export interface Sender {
  member: Member;
  /** The envelope's device id. */
  device: string;
  /** The device's key; null when no such device is registered to this member. */
  key: PublicKey | null;
}
