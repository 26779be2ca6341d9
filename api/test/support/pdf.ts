import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

/** What Debian's poppler and qpdf, programs of other makers, read in a file. */
export interface PdfRead {
  /** In the order of the file's own content, each run of white space one space. */
  readonly text: string;
  readonly info: Readonly<Record<string, string>>;
  readonly fonts: readonly { readonly name: string; readonly embedded: boolean; readonly unicode: boolean }[];
  /** The names of its parts, such as H1, Table, Figure, in order. */
  readonly structure: readonly string[];
  /** What qpdf says; it throws where the file is not sound. */
  readonly check: string;
}

export function readPdf(pdf: Buffer): PdfRead {
  const folder = mkdtempSync(path.join(tmpdir(), 'ellwand-pdf-'));
  const file = path.join(folder, 'sheet.pdf');
  const run = (program: string, ...args: string[]) =>
    execFileSync(program, args, { encoding: 'utf8', maxBuffer: 16 * 1024 * 1024, timeout: 30_000 });
  try {
    writeFileSync(file, pdf);
    return {
      text: run('pdftotext', '-raw', file, '-').replace(/\s+/gu, ' '),
      info: infoOf(run('pdfinfo', file)),
      fonts: fontsOf(run('pdffonts', file)),
      structure: run('pdfinfo', '-struct', file)
        .split('\n')
        .map((line) => line.trim().split(/[ (:]/u)[0] ?? '')
        .filter((name) => name !== ''),
      check: run('qpdf', '--check', file),
    };
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

function infoOf(printed: string): Record<string, string> {
  const pairs = printed.split('\n').map((line) => line.split(/:\s+/u));
  return Object.fromEntries(pairs.map(([name = '', ...rest]) => [name.trim(), rest.join(': ').trim()]));
}

/** The columns of `pdffonts` have fixed places: emb, sub and uni follow the encoding. */
function fontsOf(printed: string): PdfRead['fonts'] {
  const [head = '', , ...rows] = printed.split('\n').filter((line) => line !== '');
  const at = (column: string) => head.indexOf(column);
  return rows.map((row) => ({
    name: row.slice(0, at('type')).trim(),
    embedded: row.slice(at('emb'), at('sub')).trim() === 'yes',
    unicode: row.slice(at('uni'), at('object')).trim() === 'yes',
  }));
}
