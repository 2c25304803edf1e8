import { askPersistence } from '../storage';
import { layBallast } from './ballast';

let done = false;

/**
 * Once in a page's life, after the first saved entry: asks the browser to keep the storage and lays the ballast in.
 * Neither is waited for, and neither can fail a save.
 */
export function afterSave(): void {
  if (done) return;
  done = true;
  void askPersistence();
  layBallast().catch(() => {
    // No room for the ballast: the phone is already full, and the next save says so.
    done = false;
  });
}
