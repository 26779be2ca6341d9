import { useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { findingsQuery } from '../features/measuring/api/findings.js';
import { layIn } from '../features/measuring/api/sheet.js';
import { useOffline } from '../offline/context.js';
import { reach } from '../offline/reach.js';

/** Sends in the name of whoever is signed in, and lays into the open screens what the API has kept. */
export function useAttendant(userId: string | null): void {
  const { outbox, onArrived, onPicture } = useOffline();
  const queries = useQueryClient();
  useEffect(() => {
    outbox.signedIn(userId);
    return () => outbox.signedIn(null);
  }, [outbox, userId]);
  useEffect(() => {
    const stops = [
      onArrived((arrived) => {
        layIn(queries, arrived);
        void queries.invalidateQueries({ queryKey: findingsQuery(arrived.sheetId).queryKey });
      }),
      onPicture((garmentId) => void queries.invalidateQueries({ queryKey: ['garment', garmentId] })),
      // Back after a silence: what was shown from this device may have changed at the museum meanwhile. What is being
      // asked already is left to it: were one address silent and the others not, asking anew would never end.
      reach.subscribe(() => {
        if (!reach.isSilent()) void queries.invalidateQueries({}, { cancelRefetch: false });
      }),
    ];
    return () => {
      for (const stop of stops) stop();
    };
  }, [queries, onArrived, onPicture]);
}
