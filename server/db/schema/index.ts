export * from './bench.ts';
export * from './club.ts';
export * from './cuts.ts';
export * from './designs.ts';
export * from './flags.ts';
export * from './people.ts';
