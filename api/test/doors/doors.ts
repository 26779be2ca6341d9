import type { Role } from '@ellwand/shared/records/roles';
import type { Door } from './routes';

/**
 * Every door of the house and who may pass it, written down a second time, apart from the code. A route that is not
 * here fails the walk.
 */
export const doors: Readonly<Record<string, Door>> = {
  'GET /health/live': 'public',
  'GET /health/ready': 'public',
  'GET /api/openapi.json': 'public',
  'GET /api/docs': 'public',
  'GET /api/docs.css': 'public',
  'GET /media/:imageId/:form': 'public',
  'GET /workroom': 'public',
  'GET /workroom/{*path}': 'public',
  'GET /{*page}': 'public',

  'POST /api/v1/session': 'public',
  'GET /api/v1/session': 'signed-in',
  'DELETE /api/v1/session': 'signed-in',
  'POST /api/v1/session/refresh': 'public',
  'POST /api/v1/invitations/look-up': 'public',
  'POST /api/v1/invitations/accept': 'public',
  'POST /api/v1/first-administrator': 'public',

  'GET /api/v1/catalogue/garments': 'public',
  'GET /api/v1/catalogue/garments/:number': 'public',
  'GET /api/v1/catalogue/garments/:number/v/:version': 'public',
  'GET /api/v1/catalogue/points': 'public',
  'GET /api/v1/catalogue/kinds': 'public',
  'GET /api/v1/catalogue/front': 'public',

  'GET /api/v1/workroom/users': 'user:manage',
  'PATCH /api/v1/workroom/users/:id': 'user:manage',
  'GET /api/v1/workroom/invitations': 'user:manage',
  'POST /api/v1/workroom/invitations': 'user:manage',
  'DELETE /api/v1/workroom/invitations/:id': 'user:manage',
  'GET /api/v1/workroom/settings/damage-reports': 'user:manage',
  'PUT /api/v1/workroom/settings/damage-reports': 'user:manage',
  'GET /api/v1/workroom/colleagues': 'garment:read',
  'GET /api/v1/workroom/audit': 'audit:read',

  'GET /api/v1/workroom/garments': 'garment:read',
  'POST /api/v1/workroom/garments': 'garment:write',
  'GET /api/v1/workroom/garments/:id': 'garment:read',
  'PUT /api/v1/workroom/garments/:id/record': 'garment:write',
  'POST /api/v1/workroom/garments/:id/parts': 'garment:write',
  'DELETE /api/v1/workroom/parts/:id': 'garment:write',

  'GET /api/v1/workroom/parts/:id/cut-sheet': 'garment:read',
  'PUT /api/v1/workroom/parts/:id/cut-sheet': 'garment:write',

  'POST /api/v1/workroom/garments/:id/worn-together': 'garment:write',
  'GET /api/v1/workroom/garments/:id/noted-at-table': 'garment:read',
  'POST /api/v1/workroom/table-notes/:id/settle': 'garment:write',

  'POST /api/v1/workroom/parts/:id/sheets': 'sheet:write',
  'GET /api/v1/workroom/parts/:id/sheets': 'garment:read',
  'PUT /api/v1/workroom/parts/:id/speaking-sheet': 'garment:write',
  'GET /api/v1/workroom/sheets/:id': 'garment:read',
  'PUT /api/v1/workroom/sheets/:id/facts': 'sheet:write',
  'POST /api/v1/workroom/sheets/:id/readings': 'sheet:write',
  'POST /api/v1/workroom/sheets/:id/table-notes': 'sheet:write',
  'GET /api/v1/workroom/sheets/:id/findings': 'garment:read',
  'GET /api/v1/workroom/sheets/:id/sheet.pdf': 'garment:read',
  'GET /api/v1/workroom/parts/:id/blank-sheet.pdf': 'garment:read',
  'GET /api/v1/workroom/kinds/:kind/blank-sheet.pdf': 'garment:read',
  'POST /api/v1/workroom/sheets/:id/findings/answers': 'sheet:write',
  'POST /api/v1/workroom/sheets/:id/complete': 'sheet:write',
  'POST /api/v1/workroom/sheets/:id/reopen': 'sheet:write',

  'GET /api/v1/workroom/repeatability': 'garment:read',

  'GET /api/v1/workroom/protocols': 'garment:read',
  'GET /api/v1/workroom/protocols/:kind': 'garment:read',
  'POST /api/v1/workroom/protocols/:kind': 'protocol:write',
  'POST /api/v1/workroom/sheets/:id/newest-protocol': 'sheet:write',

  'GET /api/v1/workroom/garments/:id/images': 'garment:read',
  'POST /api/v1/workroom/garments/:id/images': 'image:write',
  'PATCH /api/v1/workroom/images/:id': 'image:write',
  'DELETE /api/v1/workroom/images/:id': 'image:write',
  'GET /api/v1/workroom/images/:id/forms/:form': 'garment:read',

  'GET /api/v1/workroom/garments/:id/review': 'garment:read',
  'GET /api/v1/workroom/garments/:id/preview': 'garment:read',
  'GET /api/v1/workroom/garments/:id/revisions': 'garment:read',
  'POST /api/v1/workroom/garments/:id/submit': 'record:submit',
  'POST /api/v1/workroom/garments/:id/return': 'record:review',
  'POST /api/v1/workroom/garments/:id/approve': 'record:review',
  'POST /api/v1/workroom/garments/:id/publish': 'record:publish',
  'POST /api/v1/workroom/garments/:id/withdraw': 'record:withdraw',
  'POST /api/v1/workroom/garments/:id/revise': 'garment:write',
};

/** Which roles pass which door: the table of roles, written down a second time. */
export const rolesThrough: Readonly<Record<Exclude<Door, 'public' | 'signed-in'>, readonly Role[]>> = {
  'garment:read': ['recorder', 'curator', 'desk', 'administrator'],
  'garment:write': ['recorder', 'curator'],
  'sheet:write': ['recorder', 'curator'],
  'image:write': ['recorder', 'curator'],
  'record:submit': ['recorder', 'curator'],
  'record:review': ['curator'],
  'record:publish': ['curator'],
  'record:withdraw': ['curator'],
  'protocol:write': ['administrator'],
  'user:manage': ['administrator'],
  'audit:read': ['curator', 'administrator'],
};
