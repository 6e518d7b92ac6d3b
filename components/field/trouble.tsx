/** A sentence about something that did not work, read aloud at once. */
export function Trouble({ children }: { children: string }) {
  return (
    <p role="alert" className="mx-4 my-2 border-l-8 border-ink bg-shade px-3 py-2 text-base font-semibold">
      {children}
    </p>
  );
}
