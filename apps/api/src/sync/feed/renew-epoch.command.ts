import { runAsMigrator } from '../../database/run-as-migrator';
import { renewEpoch } from './renew-epoch';

runAsMigrator(renewEpoch);
