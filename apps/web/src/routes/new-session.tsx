export { NewSessionPage as Component } from '../features/sessions/NewSessionPage';
