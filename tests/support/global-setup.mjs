export { startForJest as default } from './cluster.mjs';
