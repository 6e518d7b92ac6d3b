/** A course of conspicuity tape across the page, segments of one length, dark and white. */
export function TapeCourse() {
  return (
    <div
      aria-hidden="true"
      className="h-4 border-y-2 border-ink bg-[repeating-linear-gradient(90deg,var(--notch)_0_3.5rem,var(--white)_3.5rem_7rem)] forced-color-adjust-none"
    />
  );
}
