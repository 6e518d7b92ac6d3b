import { frontWords } from "@/lib/domain/messages/session";
import { FrontDrawing } from "./front-drawing";
import { SignUpLine } from "./no-account";
import { TapeCourse } from "./tape-course";
import { WaySign } from "./way-sign";

/** The front page: what this is, the ways in, and the rig with the seven places to stand. */
export function FrontPage() {
  return (
    <div className="flex min-h-dvh flex-col">
      <TapeCourse />
      <main className="@container mx-auto w-full max-w-[76rem] grow px-4 pt-7 pb-8 sm:px-8 lg:pt-9">
        <div className="grid grid-cols-1 items-start gap-x-14 gap-y-7 @4xl:grid-cols-[minmax(0,1fr)_25rem]">
          <div>
            <h1 className="text-[clamp(2rem,15vw,6rem)] leading-[0.86] font-extrabold tracking-[-0.03em]">
              {frontWords.title}
            </h1>
            <p className="mt-4 max-w-[26ch] text-2xl leading-[1.15] font-extrabold sm:text-[1.75rem]">
              {frontWords.lead}
            </p>
            <p className="mt-3 max-w-[58ch]">{frontWords.job}</p>
          </div>
          <div>
            <WaySign />
            <SignUpLine />
          </div>
        </div>
        <section className="mt-8 border-t-hair border-ink pt-3 lg:mt-6">
          <h2 className="text-base font-semibold text-soft">{frontWords.stationsTitle}</h2>
          <div className="grid grid-cols-1 items-center gap-x-12 gap-y-4 @4xl:grid-cols-[minmax(0,1fr)_15rem]">
            <div className="-mx-1 max-w-[52rem]">
              <FrontDrawing />
            </div>
            <ol className="grid gap-x-4 @2xs:grid-cols-2 @4xl:grid-cols-1">
              {frontWords.stations.map((station, at) => (
                <li key={station} className="flex items-baseline gap-3 border-b border-rule py-1.5">
                  <span aria-hidden="true" className="tabular font-semibold">
                    {at + 1}
                  </span>
                  <span>{station}</span>
                </li>
              ))}
            </ol>
          </div>
        </section>
      </main>
      <footer className="border-t-hair border-rule">
        <p className="mx-auto max-w-[76rem] px-4 py-4 text-base text-soft sm:px-8">{frontWords.deference}</p>
      </footer>
    </div>
  );
}
