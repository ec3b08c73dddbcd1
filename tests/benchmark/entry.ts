export { marchElements, marchRig } from '../unit/engine/march'
export * from './rigs'
