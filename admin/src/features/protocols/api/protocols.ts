import type { GarmentKind } from '@ellwand/shared/points/kinds';
import {
  type NewProtocolInput,
  ProtocolHistory,
  ProtocolList,
  ProtocolMade,
} from '@ellwand/shared/records/protocol';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';

export const protocolsQuery = queryOptions({
  queryKey: ['protocols'],
  queryFn: ({ signal }) => api.get('/workroom/protocols', ProtocolList, { signal }),
});

export interface ProtocolName {
  readonly kind: GarmentKind;
  readonly wornTogether: boolean;
}

const addressOf = ({ kind, wornTogether }: ProtocolName) =>
  `/workroom/protocols/${kind}${wornTogether ? '?wornTogether=true' : ''}`;

export const protocolHistoryQuery = (name: ProtocolName) =>
  queryOptions({
    queryKey: ['protocols', name.kind, name.wornTogether],
    queryFn: ({ signal }) => api.get(addressOf(name), ProtocolHistory, { signal }),
  });

/** @param madeFrom the version that it was made from: another one since is a conflict */
export const makeProtocol = (name: ProtocolName, madeFrom: number, body: NewProtocolInput) =>
  api.post(addressOf(name), ProtocolMade, { body, version: madeFrom });
