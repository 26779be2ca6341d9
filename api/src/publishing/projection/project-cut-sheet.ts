import { isEmptyCutSheet } from '@ellwand/shared/cut-sheet/keep-lengths';
import type { LevelRead } from '@ellwand/shared/cut-sheet/panel-notes';
import { panelSum } from '@ellwand/shared/cut-sheet/panel-sum';
import { drawnScale, markStepPx, readPair, scaleOfPattern } from '@ellwand/shared/cut-sheet/pattern-scale';
import { panelLevels } from '@ellwand/shared/cut-sheet/words';
import type { CutSheetBody, KeptLength, PublishedCutSheet } from '@ellwand/shared/records/cut-sheet';
import type { Image } from '@ellwand/shared/records/image';
import { shownUncertainty } from '@ellwand/shared/readings/uncertainty';
import { fromMmString, toMmString } from '@ellwand/shared/units/length';

/** How a part is cut, as the public reads it: without the inner note, and the pattern only where its picture is public. */
export function projectCutSheet(
  body: CutSheetBody | null | undefined,
  rounds: readonly LevelRead[],
  pictures: readonly Image[],
): PublishedCutSheet | null {
  if (!body) return null;
  const picture = pictures.find(({ id }) => id === body.pattern?.imageId);
  const shown: CutSheetBody = { ...body, innerNote: '', pattern: picture ? body.pattern : null };
  if (isEmptyCutSheet(shown)) return null;
  const { pieces, darts, neck, underarm, fullness, bones, seams, note, pattern } = shown;
  return {
    pieces: pieces.map(({ key, name, count, onFold, grain, layer, widths, note: said }) => ({
      ...{ key, name, count, onFold, grain, layer, note: said },
      widths: {
        bust: mmOf(widths.bust),
        waist: mmOf(widths.waist),
        hip: mmOf(widths.hip),
        hem: mmOf(widths.hem),
      },
    })),
    darts: darts.map(({ key, piece, where, count, centre, tipSide, ...lengths }) => ({
      ...{ key, piece, where, count, centre, tipSide },
      fromCentre: mmOf(lengths.fromCentre),
      tip: mmOf(lengths.tip),
      length: mmOf(lengths.length),
      intake: mmOf(lengths.intake),
    })),
    neck: {
      frontWidth: mmOf(neck.frontWidth),
      frontDepth: mmOf(neck.frontDepth),
      backWidth: mmOf(neck.backWidth),
      backDepth: mmOf(neck.backDepth),
    },
    underarm: { belowNeckPoint: mmOf(underarm.belowNeckPoint), aboveWaist: mmOf(underarm.aboveWaist) },
    fullness: fullness.map(({ key, where, kind, count, depth, direction, stitchedDown, note: said }) => ({
      ...{ key, where, kind, count, direction, note: said },
      depth: mmOf(depth),
      stitchedDown: mmOf(stitchedDown),
    })),
    bones: bones.map(({ key, where, count, length, material, position }) => ({
      ...{ key, where, count, material, position },
      length: mmOf(length),
    })),
    seams: seams.map(({ key, where, allowance, stitching, stitchesPer10Mm, edge, note: said }) => ({
      ...{ key, where, stitching, stitchesPer10Mm, edge, note: said },
      allowance: mmOf(allowance),
    })),
    note,
    sums: sumsOf(shown, rounds),
    pattern: pattern && picture ? projectPattern(pattern, picture) : null,
  };
}

const mmOf = (length: KeptLength | null): string | null => length?.mm ?? null;

/** Sums from which no panel is missing. */
function sumsOf(sheet: CutSheetBody, rounds: readonly LevelRead[]): PublishedCutSheet['sums'] {
  return panelLevels.flatMap((level) => {
    const sum = panelSum(sheet, level);
    if (!sum || sum.missing.length > 0) return [];
    const read = rounds.find((round) => round.level === level);
    return [
      {
        level,
        panels: sum.panels,
        sumMm: toMmString(sum.sum),
        uncertaintyMm: toMmString(shownUncertainty(sum.uncertaintyMm)),
        read: read ? { label: read.label, valueMm: toMmString(read.value) } : null,
      },
    ];
  });
}

/** Nothing while the drawing has no scale: a picture of it then stands among the pictures, and that is all. */
function projectPattern(
  pattern: NonNullable<CutSheetBody['pattern']>,
  picture: Image,
): PublishedCutSheet['pattern'] {
  const scale = scaleOfPattern(pattern);
  if (!scale || !pattern.distance) return null;
  const { distance, onPaper, pairs } = pattern;
  return {
    imageId: picture.id,
    distanceMm: distance.mm,
    drawnTo: (onPaper && drawnScale(fromMmString(distance.mm), fromMmString(onPaper.mm))) ?? null,
    pairs: pairs.map(({ name, from, to }) => {
      const { length, uncertaintyMm } = readPair(scale, { from, to }, markStepPx(picture));
      return {
        name,
        valueMm: toMmString(length),
        uncertaintyMm: toMmString(shownUncertainty(uncertaintyMm)),
      };
    }),
  };
}
