import { useEffect, useState, useSyncExternalStore } from "react";
import { heldRecord, theField } from "@/components/field/browser-field";
import { useNowMs } from "@/components/field/now";
import { WingLink } from "@/components/field/wing-link";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { exportHeld, type HeldRecord } from "@/lib/client/record-export";
import type { GuardView } from "@/lib/client/store-guard";
import type { Lost } from "@/lib/client/store-marks";
import { recentText } from "@/lib/client/time-words";
import { lostWords } from "@/lib/domain/messages/settings";
import { ExportButton } from "./export-button";
import { StoreTroubleNotice } from "./store-trouble-notice";

const calm: GuardView = { trouble: null, lost: null };

/** What is wrong with the phone's store, as it changes. */
export function useStoreGuard(): GuardView {
  return useSyncExternalStore(
    (listener) => theField().guard.subscribe(listener),
    () => theField().guard.view(),
    () => calm,
  );
}

/**
 * Above every screen of the wing: what a cleared store took with it, and what is wrong with it now.
 * @param told the screen below says itself what is wrong now, so that it is not said twice
 */
export function StoreNotices({ told }: { told: boolean }) {
  const { trouble, lost } = useStoreGuard();
  return (
    <>
      {lost && <LostNotice lost={lost} />}
      {trouble && !told && <StoreTroubleNotice trouble={trouble} />}
    </>
  );
}

function LostNotice({ lost }: { lost: Lost }) {
  const nowMs = useNowMs();
  const walks = Object.entries(lost.walks);
  const held = useHeldRecord(walks.map(([id]) => id));
  const cutShort = walks.some(([, { left }]) => left > 0);
  const title = walks.length > 0 ? lostWords.title(walks.length, cutShort) : lostWords.titleReceived;
  return (
    <div role="alert" data-lost={walks.length} className="mx-auto w-full max-w-[76rem]">
      <Notice tone="caution" title={title}>
        {walks.length > 0 && <p>{lostWords.cleared}</p>}
        <ul className="py-1">
          {walks.map(([id, { purpose, rigName, openedAt, left, length }]) => (
            <li key={id} className="font-semibold">
              {lostWords.walk(purpose, rigName, recentText(openedAt, nowMs))}
              {left > 0 && lostWords.left(left, length)}
            </li>
          ))}
        </ul>
        {lost.received > 0 && <p>{lostWords.received(lost.received)}</p>}
        {held && (
          <div className="py-2">
            <p className="pb-2 font-semibold">{lostWords.held(walks.length)}</p>
            <ExportButton file={async () => exportHeld(held())} />
          </div>
        )}
        <p className="pt-1 text-base text-soft">{lostWords.kept}</p>
        <div className="flex flex-wrap items-center gap-x-4 pt-2">
          <Button variant="plain" className="px-5" onClick={() => theField().guard.dismiss()}>
            {lostWords.read}
          </Button>
          <WingLink settings="1" className="flex min-h-field items-center px-1 underline">
            {lostWords.settings}
          </WingLink>
        </div>
      </Notice>
    </div>
  );
}

/** The record in this tab's memory, where it is one of these walks. */
function useHeldRecord(walks: readonly string[]): (() => HeldRecord) | null {
  const [held, setHeld] = useState<(() => HeldRecord) | null>(null);
  const named = walks.join();
  useEffect(() => {
    let current = true;
    void heldRecord().then((record) => {
      const ours = record && named.split(",").includes(record().walk.id);
      if (current) setHeld(() => (ours ? record : null));
    });
    return () => {
      current = false;
    };
  }, [named]);
  return held;
}
