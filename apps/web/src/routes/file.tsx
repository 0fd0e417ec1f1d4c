export { FilePage as Component } from '../features/files/FilePage';
