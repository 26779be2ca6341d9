import { pageOf } from '@ellwand/shared/records/common';
import { AuditEntry } from '@ellwand/shared/records/publishing';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { api, queryString } from '../../../lib/api-client.js';

const AuditPage = pageOf(AuditEntry);

export const auditQuery = (asked: {
  readonly page: number;
  readonly size: number;
  readonly subjectId?: string;
}) =>
  queryOptions({
    queryKey: ['audit', asked],
    placeholderData: keepPreviousData,
    queryFn: ({ signal }) => api.get(`/workroom/audit${queryString({ ...asked })}`, AuditPage, { signal }),
  });
