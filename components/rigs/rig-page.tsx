"use client";

import { useQuery } from "@tanstack/react-query";
import { useSearchParams } from "next/navigation";
import { revisionQuery, rigQuery } from "@/lib/client/rig-queries";
import { rigWords as words, revisionsWords } from "@/lib/domain/messages/rigs";
import type { RigReading } from "@/lib/domain/rigs";
import { UUID } from "@/lib/domain/uuid";
import { BackLink } from "../desk/back-link";
import { DeskHeading } from "../desk/desk-heading";
import { Gone } from "../desk/gone";
import { Fetched } from "./fetched";
import { OldRevision } from "./old-revision";
import { RigView } from "./rig-view";

const gone = (
  <Gone page={words.plainTitle} title={words.goneTitle} text={words.gone} href="/desk/rigs" to={words.toRigs} />
);
const heading = (
  <DeskHeading over={<BackLink href="/desk/rigs" label={words.back} />} title={words.plainTitle} />
);

/** One rig by the id in the query string, at its latest revision or at the one that is named. */
export function RigPage() {
  const query = useSearchParams();
  const id = query.get("id") ?? "";
  const digest = query.get("revision");
  const rig = useQuery(rigQuery(id));
  if (!UUID.test(id)) return gone;
  return (
    <Fetched query={rig} label={words.fetching} gone={gone} heading={heading}>
      {(reading) =>
        digest === null || digest === reading.revision.digest ? (
          <RigView key={reading.revision.digest} reading={reading} />
        ) : (
          <Old reading={reading} digest={digest} />
        )
      }
    </Fetched>
  );
}

function Old({ reading, digest }: { reading: RigReading; digest: string }) {
  const known = reading.revisions.some((revision) => revision.digest === digest);
  const revision = useQuery(revisionQuery(reading.id, known ? digest : null));
  if (!known) return gone;
  return (
    <Fetched query={revision} label={revisionsWords.fetching} gone={gone} heading={heading}>
      {(old) => <OldRevision rig={reading} revision={old} />}
    </Fetched>
  );
}
