export * from './a-lot';
export * from './a-ration';
export * from './a-request';
export * from './a-water-analysis';
