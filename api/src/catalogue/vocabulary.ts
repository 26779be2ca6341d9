import { groups } from '@ellwand/shared/points/groups';
import { kindIds, kindLabels } from '@ellwand/shared/points/kinds';
import { measuringPoints } from '@ellwand/shared/points/measuring-points';

/** What can be measured, in words: every point and the groups that a search may name. */
export const pointVocabulary = {
  groups: [...groups],
  items: measuringPoints.map(
    ({ id, group, name, definition, from, to, side, how, handlingStep, kinds, watchFor }) => ({
      id,
      group,
      name,
      definition,
      from,
      to,
      side,
      how,
      handlingStep,
      kinds: [...kinds],
      watchFor,
    }),
  ),
};

/** What a garment or its part may be. */
export const kindVocabulary = { items: kindIds.map((id) => ({ id, ...kindLabels[id] })) };
