import { cutSheetRoutes } from './cut-sheet-routes.js';
import { garmentRoutes } from './garment-routes.js';
import type { House } from './house.js';
import { imageRoutes } from './image-routes.js';
import { measuringRoutes } from './measuring-routes.js';
import { notedRoutes } from './noted-routes.js';
import { partSheetsRoutes } from './part-sheets-routes.js';
import { peopleRoutes } from './people-routes.js';
import { protocolRoutes } from './protocol-routes.js';
import { repeatabilityRoutes } from './repeatability-routes.js';
import { makeHandler } from './router.js';

/** A stand-in for the API over a house in memory: the same contract, checked with the same schemas. */
export const fakeApi = (house: House) =>
  makeHandler(house, {
    ...peopleRoutes,
    ...garmentRoutes,
    ...imageRoutes,
    ...measuringRoutes,
    ...protocolRoutes,
    ...cutSheetRoutes,
    ...repeatabilityRoutes,
    ...partSheetsRoutes,
    ...notedRoutes,
  });
