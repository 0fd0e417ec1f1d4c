export { SessionPage as Component } from '../features/sessions/SessionPage';
