import { fork } from 'node:child_process';
import { availableParallelism } from 'node:os';
import { fileURLToPath } from 'node:url';
import { garments } from '../garments/registry';
import { contactSheet } from './contact-sheet';
import { renderPicture, type Size } from './one';
import { pictureFiles, writePictureList, type PictureFile } from './picture-list';

const USAGE = 'npm run pictures -- [number or kind …] [--view front] [--size 2800] [--out folder] [--sheet]';
const PICTURES = fileURLToPath(new URL('../../pictures/', import.meta.url));
const CACHE = fileURLToPath(new URL('../../.cache/', import.meta.url));
/** The long side of a finished picture, px, and how much larger it is drawn first. */
const FINAL: Size = { longSide: 2800, oversample: 1.4 };

interface Wanted {
  files: PictureFile[];
  size: Size;
  folder: string;
  sheet: boolean;
}

/** Reads the command line; throws a plain sentence for what it does not understand. */
function wanted(words: readonly string[]): Wanted {
  const values = new Map<string, string>();
  const names: string[] = [];
  for (let i = 0; i < words.length; i++) {
    const word = words[i]!;
    if (word === '--sheet') values.set('sheet', 'yes');
    else if (word === '--view' || word === '--size' || word === '--out')
      values.set(word.slice(2), words[++i] ?? '');
    else if (word.startsWith('--')) throw new Error(`No option is called ${word}. Use: ${USAGE}`);
    else names.push(word.toUpperCase().startsWith('LH') ? word.toUpperCase().replaceAll('-', '.') : word);
  }
  const known = (name: string): boolean =>
    garments.some(({ number, kind }) => number === name || kind === name);
  const stranger = names.find((name) => !known(name));
  if (stranger) throw new Error(`No garment has the number or kind ${stranger}. Use: ${USAGE}`);
  const longSide = Number(values.get('size') ?? FINAL.longSide);
  if (!(longSide >= 200 && longSide <= 4000)) throw new Error('A size is between 200 and 4000 pixels.');
  const view = values.get('view');
  const files = pictureFiles(garments).filter(
    ({ garment, picture }) =>
      (names.length === 0 || names.includes(garment.number) || names.includes(garment.kind)) &&
      (!view || picture.name.includes(view)),
  );
  return {
    files,
    size: { longSide, oversample: FINAL.oversample },
    folder: values.get('out') ?? PICTURES,
    sheet: values.has('sheet'),
  };
}

interface Job {
  index: number;
  size: Size;
  folder: string;
}

/** A worker renders what it is sent, one picture at a time, and says when each is done. */
function work(): void {
  process.on('message', (job: Job) => {
    const file = pictureFiles(garments)[job.index]!;
    renderPicture(
      file.garment,
      file.picture,
      job.size,
      `${job.folder.replace(/\/?$/, '/')}${file.name}`,
    ).then(
      () => process.send?.('done'),
      (error: unknown) => {
        console.error(`${file.name}: ${String(error)}`);
        process.exit(1);
      },
    );
  });
}

/** Shares the pictures between as many workers as there are cores. */
async function renderAll({ files, size, folder }: Wanted): Promise<void> {
  const all = pictureFiles(garments);
  const queue = files.map((file) => ({
    file,
    job: { index: all.findIndex(({ name }) => name === file.name), size, folder },
  }));
  let finished = 0;
  const started = Date.now();
  const oneWorker = (): Promise<void> =>
    new Promise((resolve, reject) => {
      const worker = fork(fileURLToPath(import.meta.url), ['--worker'], { execArgv: process.execArgv });
      let current = '';
      const next = (): void => {
        const item = queue.shift();
        if (!item) return worker.disconnect();
        current = item.file.name;
        worker.send(item.job);
      };
      worker.on('message', () => {
        finished++;
        console.log(
          `${finished}/${files.length} ${current} (${Math.round((Date.now() - started) / 1000)} s)`,
        );
        next();
      });
      worker.on('exit', (code) =>
        code === 0 ? resolve() : reject(new Error(`A picture failed: ${current}`)),
      );
      next();
    });
  await Promise.all(Array.from({ length: Math.min(availableParallelism(), files.length) }, oneWorker));
}

async function main(words: readonly string[]): Promise<void> {
  const request = wanted(words);
  if (request.sheet) {
    console.log(`Contact sheet: ${await contactSheet(request.files, request.folder, CACHE)}`);
    return;
  }
  await renderAll(request);
  if (request.folder === PICTURES) await writePictureList(garments, PICTURES);
}

if (process.argv.includes('--worker')) work();
else
  main(process.argv.slice(2)).catch((error: unknown) => {
    console.error(error instanceof Error ? error.message : String(error));
    process.exitCode = 1;
  });
