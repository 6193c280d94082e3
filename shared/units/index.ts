export * from './constants';
export * from './unit-table';
export * from './convert';
