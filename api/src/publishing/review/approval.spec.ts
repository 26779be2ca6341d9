import { type Involved, mayNotApprove } from './approval';

const reader = 'reader';
const holder = 'holder';
const keyer = 'keyer';
const editor = 'editor';

const snapshot: Involved = {
  editedBy: [editor],
  parts: [
    { sheet: null },
    {
      sheet: {
        people: [{ userId: reader }, { userId: holder }],
        readings: [{ readBy: reader, recordedBy: keyer }],
      },
    },
  ],
};

describe('who may not approve', () => {
  it.each([
    ['whoever read the tape', reader, 'review.own-measuring'],
    ['whoever held it', holder, 'review.own-measuring'],
    ['whoever keyed the readings, though the sheet names them nowhere', keyer, 'review.own-measuring'],
    ['whoever edited the record', editor, 'review.own-edit'],
  ])('%s', (_who, id, code) => {
    expect(mayNotApprove(snapshot, id)?.code).toBe(code);
  });

  it('anybody else may', () => {
    expect(mayNotApprove(snapshot, 'another curator')).toBeNull();
  });
});
