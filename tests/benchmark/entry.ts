export { marchRig } from '../unit/engine/march'
export * from './rigs'
