import { useEffect } from 'react';
import { holdUpdates } from '../../../app/quiet-moment';

/** No new version of the application is offered while air is on or the camera is open. */
export function useNoUpdates(busy: boolean): void {
  useEffect(() => (busy ? holdUpdates() : undefined), [busy]);
}
