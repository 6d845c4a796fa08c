export { stopForJest as default } from './cluster.mjs';
