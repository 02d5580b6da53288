import { createHash } from "node:crypto";
import type { TextFile } from "./project";
import { type Finding, finding } from "./source";

/**
 * Words that have no place in the project: how it came about, notes to oneself, and names that belong to others.
 * They are kept by their hash, so that this list does not hold what it forbids.
 */
export const forbiddenWords: ReadonlySet<string> = new Set([
  ...["6bc636ff0103", "faa93e00a92e", "1ca7aaa322fb", "54e6289e14c7", "d27247eba6ef", "24e6654bfd1a"],
  ...["0cab1c961740", "26760e7ce5a5", "404355522396", "83d82a74a67a", "fe30030e102e"],
  ...["487b91042c7c", "c857d09db23e", "c70eca6b0f88", "7d3194f79e64", "60965168ce76", "053ea4804ef1"],
  ...["3ea125d0bff3", "5d72436256ad", "386ebc0efd04", "11fb682be0a0", "94a168d2da57", "a56f3dbc3053"],
]);

/** Notes to oneself, private paths and addresses that work on one machine only. */
const forbiddenPatterns: readonly { readonly what: string; readonly pattern: RegExp }[] = [
  { what: "a note to oneself", pattern: /\b(TO[D]O|FIX[M]E|X[X]X|HA[C]K)\b/ },
  { what: "a path of one machine", pattern: /(?<![\w.@*}/-])\/(work|root|home|Users|tmp)\/[a-z]/ },
  { what: "a package registry's address", pattern: /\bregistry\.(npmjs|yarnpkg)\b|\bnpmmirror\b/ },
  { what: "the number of an issue", pattern: /(?<![\w&"'`(#])#\d{1,4}\b(?![0-9a-fA-F;-])|\b(issue|closes|fixes) #\d+/i },
];

/** Each distinct forbidden word of a file with its first place. */
export function forbiddenWordsIn(file: TextFile, words: ReadonlySet<string> = forbiddenWords): readonly Finding[] {
  return [...firstPlaces(file.text)].flatMap(([word, offset]) =>
    words.has(hashOfWord(word)) ? [finding(file, offset, `the word "${word}" has no place in the project`)] : [],
  );
}

export function forbiddenPatternsIn(file: TextFile): readonly Finding[] {
  return forbiddenPatterns.flatMap(({ what, pattern }) => {
    const match = pattern.exec(file.text);
    return match === null ? [] : [finding(file, match.index, `${what}: ${match[0]}`)];
  });
}

export function hashOfWord(word: string): string {
  return createHash("sha256").update(word).digest("hex").slice(0, 12);
}

// words in capitals are taken as they stand: two letters of a name can be a syllable elsewhere
function firstPlaces(text: string): Map<string, number> {
  const places = new Map<string, number>();
  for (const match of text.matchAll(/[A-Za-z][a-z]+|[A-Z]+(?![a-z])/g)) {
    const word = match[0].length > 2 ? match[0].toLowerCase() : match[0];
    if (!places.has(word)) places.set(word, match.index);
  }
  return places;
}
