export * from './people.ts';
export * from './sign-in.ts';
export * from './pieces.ts';
export * from './proofs.ts';
export * from './releases.ts';
export * from './calculators.ts';
export * from './outbox.ts';
export * from './daybook.ts';
