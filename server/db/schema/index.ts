export * from './accounts';
export * from './audit';
export * from './idempotency';
export * from './kept-things';
export * from './people';
export * from './results';
