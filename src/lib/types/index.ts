export * from './api';
export * from './api-requests';
export * from './fields';
export * from './makers';
export * from './readings';
export * from './rows';
export * from './tables';
export * from './values';
