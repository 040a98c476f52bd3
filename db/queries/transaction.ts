export { transaction } from '../client';
