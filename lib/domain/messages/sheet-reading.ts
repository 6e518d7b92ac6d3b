/** What is said of a sheet that cannot be taken as it is. */
export const sheetReadingWords = {
  newer: (version: number, newest: number) =>
    `It is of version ${version}; the newest known here is ${newest}.`,
  twice: "This id stands on the sheet already. Each thing has its own.",
  otherKind: "This id belongs to another kind of thing.",
  foreign: "This id is taken. Give the thing a new one.",
  taken: "There is a rig with this id already.",
  keeperOnly: "Only the organization that keeps a rig saves its sheet.",
} as const;
