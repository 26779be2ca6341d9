import { pictureTypes, sniffPicture } from './sniff-picture';

const ascii = (text: string) => Buffer.from(text, 'latin1');

describe('what a file is, by its first bytes', () => {
  it.each([
    ['jpeg', Buffer.from([0xff, 0xd8, 0xff, 0xe0])],
    ['png', Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a])],
    ['webp', ascii('RIFF\x10\0\0\0WEBPVP8 ')],
    ['tiff', ascii('II*\0\x08\0\0\0')],
    ['tiff', ascii('MM\0*\0\0\0\x08')],
  ] as const)('takes %s', (type, head) => {
    expect(sniffPicture(head)).toBe(type);
    expect(Object.keys(pictureTypes)).toContain(type);
  });

  it.each([
    ['an empty file', Buffer.alloc(0), 'The file is empty.'],
    ['a GIF', ascii('GIF89a'), 'GIF pictures are not taken'],
    ['a PDF', ascii('%PDF-1.7'), 'This is a PDF'],
    ['SVG', ascii('<svg xmlns="http://www.w3.org/2000/svg">'), 'markup'],
    ['SVG behind a byte-order mark and white space', Buffer.from('\uFEFF \n<?xml version="1.0"?>'), 'markup'],
    ['HEIC', ascii('\0\0\0\x18ftypheic'), 'HEIC'],
    ['a camera’s raw file', ascii('II*\0\x10\0\0\0CR\x02\0'), 'raw file'],
    ['half a signature', Buffer.from([0x89, 0x50, 0x4e]), 'not a picture'],
    ['a RIFF file that is sound', ascii('RIFF\x10\0\0\0WAVEfmt '), 'not a picture'],
  ])('refuses %s with 415 and says so', (_, head, says) => {
    expect(() => sniffPicture(head)).toThrow(expect.objectContaining({ status: 415, code: 'image.type' }));
    expect(() => sniffPicture(head)).toThrow(says);
  });
});
