import { rigWords as words } from "@/lib/domain/messages/rigs";
import type { Procedure } from "@/lib/domain/sheet/sheet";
import { DeskPhoto } from "../desk/desk-photo";
import { Notice } from "../ui/notice";

/** The photograph of the manual's page, where there is one, and what no page here can stand for. */
export function ProcedurePhoto({ procedure }: { procedure: Procedure | undefined }) {
  if (procedure?.says !== "how") return null;
  const { photo } = procedure;
  return (
    <div className="mt-2 space-y-3">
      {photo && (
        <div className="w-64 max-w-full">
          <DeskPhoto photo={{ seq: 0, sha256: photo.sha256, check: null, arrived: true }} alt={words.photo} />
        </div>
      )}
      <Notice>{words.manualCaution}</Notice>
    </div>
  );
}
