/** The pages docs/measuring/points.md and derivations.md, written from the code they describe. */
import { derivations } from '../derivations/registry.js';
import { kindLabels } from '../points/kinds.js';
import { groups } from '../points/groups.js';
import {
  type CataloguedPoint,
  measuringPoint,
  pointsInGroup,
  softRangeFor,
} from '../points/measuring-points.js';
import { handlingStepLabels, howLabels, sideLabels } from '../points/point.js';
import { toMmString } from '../units/length.js';

const WRITTEN_FROM_CODE = 'This page is written from the code; a test fails when they part.';

export function derivationsPage(): string {
  const sections = derivations.map(({ id, label, formula, kinds, needs }) => {
    const figures =
      typeof needs === 'string'
        ? [needs]
        : needs.map((need) => need.map((pointId) => measuringPoint(pointId).name).join(', else '));
    return [
      `## ${label}`,
      '',
      `\`${id}\` = ${formula}`,
      '',
      `- Needs: ${figures.join('; ')}`,
      `- For: ${kinds.map((kind) => kindLabels[kind].plural).join(', ')}`,
      '',
    ].join('\n');
  });
  return `# Derived values

Worked out from readings by a formula that is shown beside them, and never typed. ${WRITTEN_FROM_CODE}

A difference carries u = √(u₁² + u₂²). A ratio q = a ÷ b carries u² = (u_a ÷ b)² + (q · u_b ÷ b)².
A sum of panels carries the plain sum of their uncertainties: read one after the other by the same hand they may all be
out the same way, so that eight panels each a millimetre over are eight over. A half counts twice, and so does its
uncertainty. The figures that were put in are shown with the value.

Of a pair, left goes with left and right with right; two sleeves are never averaged. Parts of one garment are taken
together where the formula says so, each by its newest sheet.

${sections.join('\n')}`;
}

export function pointsPage(): string {
  const sections = groups.map(
    ({ id, label }) => `## ${label}\n\nGroup \`${id}\`\n\n${pointsInGroup(id).map(pointSection).join('\n')}`,
  );
  return `# Measuring points

Every point of every protocol: where from, where to, how the tape lies, what to watch for. ${WRITTEN_FROM_CODE}

Left and right are as worn. Ranges are for asking, never for refusing. Those of adults' girths and widths rest on
ANSUR II, the body measurements of the US Army of 2012 (open data), widened for the cut and for what was worn
beneath; for the others no published survey of garments was found, and they are the house's experience.

Two rounds of a point may lie 3 mm apart, 5 mm above a metre, and 2 mm more for each join of tape lengths; twice as
much where a half is read and doubled. A house setting. A museum may make points of its own, with their own line on
the diagram; checks and uncertainty treat them as they treat these.

${sections.join('\n')}`;
}

function pointSection(point: CataloguedPoint): string {
  const kinds = point.kinds.map((kind) => kindLabels[kind].plural).join(', ');
  const tape = `${sideLabels[point.side]}, ${howLabels[point.how]}. ${handlingStepLabels[point.handlingStep]}.`;
  return [
    `### ${point.name}`,
    '',
    `\`${point.id}\` ${point.definition}`,
    '',
    `- From ${point.from} to ${point.to}`,
    `- ${tape}`,
    `- For: ${kinds}`,
    `- Usual: ${rangesText(point)}. ${basesText(point)}`,
    ...(point.paired ? ['- Left and right, as worn, may each be read'] : []),
    ...(point.levelRecorded ? ['- Says how its level was found'] : []),
    ...(point.takesTapeLengths ? ['- May be counted in whole tapes and a rest'] : []),
    `- Watch for: ${point.watchFor}`,
    '',
  ].join('\n');
}

function rangesText(point: CataloguedPoint): string {
  const ranges = point.kinds.map((kind) => {
    const { from, to } = softRangeFor(point, kind);
    return { kind, text: `${toMmString(from)} to ${toMmString(to)} mm` };
  });
  const texts = [...new Set(ranges.map(({ text }) => text))];
  if (texts.length === 1) return texts.join('');
  return ranges.map(({ kind, text }) => `${kindLabels[kind].plural} ${text}`).join('; ');
}

function basesText(point: CataloguedPoint): string {
  const bases = point.kinds.map((kind) => softRangeFor(point, kind).basis);
  return [...new Set(bases)].join(' ');
}
