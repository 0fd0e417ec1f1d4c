export { SessionsPage as Component } from '../features/sessions/SessionsPage';
