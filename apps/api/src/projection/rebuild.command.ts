import { runAsMigrator } from '../database/run-as-migrator';
import { dropProjections } from './drop-projections';

runAsMigrator(dropProjections);
