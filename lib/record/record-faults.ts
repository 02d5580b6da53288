/** What a document can have wrong before anything is computed from it; each with its place. */
export type RecordFault = NotJson | NotAsNeeded | UnknownKey | RepeatedName | UnknownReference | SoundingWithoutPlace | NotBallast;

export type NotJson = { readonly type: "NotJson"; readonly reason: string; readonly path: string };

/** needed and given in words: "a number above 0", "−3" */
export type NotAsNeeded = { readonly type: "NotAsNeeded"; readonly needed: string; readonly given: string; readonly path: string };

export type UnknownKey = { readonly type: "UnknownKey"; readonly key: string; readonly path: string };

export type RepeatedName = { readonly type: "RepeatedName"; readonly name: string; readonly first: string; readonly path: string };

export type UnknownReference = {
  readonly type: "UnknownReference";
  readonly kind: ReferenceKind;
  readonly name: string;
  readonly path: string;
};
export type ReferenceKind = "station" | "series" | "mark" | "freeboard mark" | "weight" | "tank" | "move" | "hydrometer";

/** A sounding belongs to a round or to a move, not to neither or both. */
export type SoundingWithoutPlace = { readonly type: "SoundingWithoutPlace"; readonly given: "neither" | "both"; readonly path: string };

/** Only ballast used as the shifting weight is sounded at a move. */
export type NotBallast = { readonly type: "NotBallast"; readonly tank: string; readonly path: string };
