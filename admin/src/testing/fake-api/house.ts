import type { CutSheet } from '@ellwand/shared/records/cut-sheet';
import type { Garment } from '@ellwand/shared/records/garment';
import type { ProtocolVersion } from '@ellwand/shared/records/protocol';
import type { Settlement } from '@ellwand/shared/records/noted';
import type { PartSheets } from '@ellwand/shared/records/part-sheets';
import type { Change } from '@ellwand/shared/records/publishing';
import type { Invitation, Person } from '@ellwand/shared/records/session';
import type { FindingView, Sheet } from '@ellwand/shared/records/sheet';
import type { z } from 'zod';
import { bodiceCutSheet } from './cut-sheets.js';
import { sampleGarments } from './garments.js';
import { idOf, invitation, staff } from './people.js';
import { sampleProtocols } from './protocols.js';
import { sampleRepeated } from './repeatability-routes.js';
import { sheetsOverTheYears } from './sheets-over-the-years.js';
import { sampleSheets } from './sheets.js';

type PersonShown = z.infer<typeof Person>;

/** Larkmoor House in memory: what the real API keeps in its database, small enough to look through. */
export class House {
  readonly garments: Garment[] = sampleGarments();
  readonly sheets: Sheet[];
  readonly people: PersonShown[] = Object.values(staff).map((one) => ({ ...one }));
  readonly invitations: z.infer<typeof Invitation>[] = [{ ...invitation }];
  /** Every version of every protocol. */
  readonly protocols: ProtocolVersion[] = sampleProtocols();
  readonly cutSheets = new Map<string, CutSheet>([[bodiceCutSheet.partId, bodiceCutSheet]]);
  /** By point, what was read more than once. */
  readonly repeated = new Map(sampleRepeated);
  readonly answers = new Map<string, NonNullable<FindingView['answer']>>();
  /** What became of notes from the table, by the note. */
  readonly settled = new Map<string, Settlement>();
  /** Who is told of damage seen at the table. */
  damageReportedTo: readonly string[] = [];
  /** Which sheet was chosen to speak for a part, by the part. */
  readonly choices = new Map<string, NonNullable<PartSheets['chosen']>>();
  readonly changes: Change[] = [
    {
      kind: 'changed',
      area: 'record',
      label: 'Title',
      before: 'Red bodice',
      after: 'Bodice of dark red wool',
    },
    { kind: 'added', area: 'measurement', label: 'Waist (bodice)', before: null, after: '612 mm' },
    { kind: 'removed', area: 'picture', label: 'Picture, side', before: 'picture-7.jpg', after: null },
  ];
  readonly audit: string[] = [
    'Wren Aldous opened a sheet for LH.1966.30.1',
    'Imogen Sallow published LH.1954.17, version 1',
  ];
  /** Who is signed in; null when the session has ended. */
  signedIn: PersonShown | null;
  /** Whether a refresh is granted while nobody is signed in by an access token. */
  refreshes = true;
  mayNotApprove: string | null = null;
  private given = 5000;

  constructor(signedIn: PersonShown | null = staff.recorder) {
    this.signedIn = signedIn;
    this.sheets = [...sampleSheets(this.garments), ...sheetsOverTheYears(this.garments)];
  }

  newId(): string {
    this.given += 1;
    return idOf(this.given);
  }

  garment(id: string): Garment | undefined {
    return this.garments.find((garment) => garment.id === id);
  }

  sheet(id: string): Sheet | undefined {
    return this.sheets.find((sheet) => sheet.id === id);
  }
}
