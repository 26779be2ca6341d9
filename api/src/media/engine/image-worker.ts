/**
 * The decoding process: sharp, and nothing else of Ellwand. It is given little memory and little time
 * (see image-engine.ts), reads the file types that are wanted and no others, and may be killed at any moment.
 */
import { open, rm } from 'node:fs/promises';
import sharp, { type Metadata } from 'sharp';
import { formWidths } from '@ellwand/shared/records/image';
import { copyWithoutAncillaries } from '../intake/png-chunks';
import { type EngineAnswer, type EngineReady, type EngineRequest, tooMuch } from './engine-messages';

const mostPixels = 100_000_000;
/** Narrower than the smallest form: nothing could be shown of it. */
const leastWidth = Math.min(...formWidths);
const masterWidth = Math.max(...formWidths);
/** A strip that is longer would be beyond what AVIF and JPEG hold at the widest form. */
const mostTimesAsLong = 8;
const jpegQuality = 82;
const avif = { quality: 55, effort: 2 } as const;

type Inspect = Extract<EngineRequest, { kind: 'inspect' }>;
type Make = Extract<EngineRequest, { kind: 'make' }>;

class Refused extends Error {}

sharp.cache(false);
sharp.concurrency(1);
sharp.block({ operation: ['VipsForeignLoad'] });
sharp.unblock({
  operation: [
    'VipsForeignLoadJpegFile',
    'VipsForeignLoadPngFile',
    'VipsForeignLoadWebpFile',
    'VipsForeignLoadTiffFile',
  ],
});

async function inspect(request: Inspect): Promise<EngineAnswer> {
  try {
    const source = request.type === 'png' ? await strippedPng(request) : request.source;
    const size = checkedSize(await sharp(source, { limitInputPixels: false }).metadata(), request.type);
    await sharp(source, { limitInputPixels: mostPixels, failOn: 'error', sequentialRead: true })
      .autoOrient()
      .resize({ width: masterWidth, withoutEnlargement: true })
      .flatten({ background: '#ffffff' })
      .toColourspace('srgb')
      .tiff({ compression: 'none' })
      .toFile(request.master);
    return { ok: true, ...size };
  } finally {
    await rm(request.scratch, { force: true });
  }
}

async function strippedPng({ source, scratch }: Inspect): Promise<string> {
  const from = await open(source, 'r');
  const to = await open(scratch, 'wx', 0o600);
  try {
    const copied = await copyWithoutAncillaries(from, to);
    if (copied === 'animated') throw new Refused('This picture moves. Send a still one.');
    if (copied === 'broken') throw new Refused('This PNG is damaged or not complete.');
    return scratch;
  } finally {
    await from.close();
    await to.close();
  }
}

/** @throws Refused where the picture is too large, too small, too long, moving, or not what it began as */
function checkedSize(metadata: Metadata, type: string): { widthPx: number; heightPx: number } {
  const { width: widthPx, height: heightPx } = metadata.autoOrient;
  if (metadata.format !== type) throw new Refused('This file is not the kind of picture that it says it is.');
  if (type === 'webp' && (metadata.pages ?? 1) > 1)
    throw new Refused('This picture moves. Send a still one.');
  if (widthPx * heightPx > mostPixels) {
    const megapixels = Math.ceil((widthPx * heightPx) / 1_000_000);
    throw new Refused(`This picture has ${megapixels} megapixels; at most 100 are taken.`);
  }
  if (widthPx < leastWidth) {
    throw new Refused(`This picture is ${widthPx} pixels wide; at least ${leastWidth} are needed.`);
  }
  if (heightPx > widthPx * mostTimesAsLong) {
    throw new Refused(
      `This picture is more than ${mostTimesAsLong} times as high as it is wide. Send parts of it.`,
    );
  }
  return { widthPx, heightPx };
}

async function make({ master, format, widthPx, target, xmp }: Make): Promise<EngineAnswer> {
  const resized = sharp(master, { failOn: 'error' })
    .resize({ width: widthPx, withoutEnlargement: true })
    .withXmp(xmp);
  const form = format === 'avif' ? resized.avif(avif) : resized.jpeg({ quality: jpegQuality, mozjpeg: true });
  const { width, height } = await form.toFile(target);
  return { ok: true, widthPx: width, heightPx: height };
}

async function answer(request: EngineRequest): Promise<EngineAnswer> {
  try {
    return await (request.kind === 'inspect' ? inspect(request) : make(request));
  } catch (fault) {
    if (fault instanceof Refused) return { ok: false, sentence: fault.message };
    // What the decoder says is for the log; the sender can only send another copy.
    const said = fault instanceof Error ? fault.message : String(fault);
    process.stderr.write(`${said}\n`);
    return {
      ok: false,
      sentence: /memory/i.test(said) ? tooMuch : 'This picture is damaged or not complete.',
    };
  }
}

process.on('message', (request: EngineRequest) => {
  void answer(request).then((said) => process.send?.(said));
});
// The API is gone: so is the reason to go on.
process.on('disconnect', () => process.exit());

const ready: EngineReady = { ready: true };
process.send?.(ready);
