import { forbidden, type Refusal } from '../../common/refusal';

/** As much of a snapshot as tells who had a hand in it. */
export interface Involved {
  readonly editedBy: readonly string[];
  readonly parts: readonly {
    readonly sheet: {
      readonly people: readonly { readonly userId: string }[];
      readonly readings: readonly { readonly readBy: string; readonly recordedBy: string }[];
    } | null;
  }[];
}

/**
 * Why a person may not approve what was frozen: whoever is named on a sheet, or read or keyed any of its readings,
 * may not approve what it measured; whoever edited may not approve what they edited. No role outweighs this.
 */
export function mayNotApprove(snapshot: Involved, personId: string): Refusal | null {
  if (measuredBy(snapshot).has(personId)) {
    return forbidden(
      'review.own-measuring',
      'You are named on a measuring sheet of this garment. Somebody who did not measure it has to approve it.',
    );
  }
  if (snapshot.editedBy.includes(personId)) {
    return forbidden(
      'review.own-edit',
      'You had a hand in this record since it was last published. Somebody who had none has to approve it.',
    );
  }
  return null;
}

function measuredBy(snapshot: Involved): Set<string> {
  const sheets = snapshot.parts.flatMap((part) => part.sheet ?? []);
  return new Set(
    sheets.flatMap((sheet) => [
      ...sheet.people.map((person) => person.userId),
      ...sheet.readings.flatMap((reading) => [reading.readBy, reading.recordedBy]),
    ]),
  );
}
