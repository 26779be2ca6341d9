import { SheetFindings } from '@ellwand/shared/records/sheet';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';
import { referenceOf } from '../../../lib/query-client.js';
import { referenceKeys } from '../../../offline/reference.js';

export const findingsQuery = (sheetId: string) =>
  queryOptions({
    queryKey: ['findings', sheetId],
    queryFn: ({ signal, client }) =>
      referenceOf(client).through(referenceKeys.findings(sheetId), SheetFindings, () =>
        api.get(`/workroom/sheets/${sheetId}/findings`, SheetFindings, { signal }),
      ),
  });
