import { registerDevice } from "@/lib/server/contracts/devices";
import { deviceRegistered } from "@/lib/server/devices";
import { serve } from "@/lib/server/serve";

export const POST = serve(registerDevice, ({ member, body }) => deviceRegistered(member, body));
