export * from './system/backflow';
export * from './system/pipe-run';
export * from './system/system';
export * from './system/zone';
export * from './entry/envelope';
export * from './entry/log-entry';
export * from './entry-types/registry';
export { endSigns } from './entry-types/air';
export * from './visit/visit-state';
