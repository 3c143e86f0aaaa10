export { flagWords } from './flag-figure';
export * from './report';
