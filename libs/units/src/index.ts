export * from './result';
export * from './outcome';
export * from './factors';
export * from './pressure';
export * from './temperature';
export * from './convert';
export * from './company-units';
