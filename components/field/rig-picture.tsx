import { RigPlan } from "@/components/drawings/rig-plan";

/** The rig from above, as large as its place and with nobody standing by it. */
export function RigPicture() {
  return (
    <div aria-hidden="true" className="*:h-auto *:w-full [&_circle]:hidden">
      <RigPlan station="coach-tail" />
    </div>
  );
}
