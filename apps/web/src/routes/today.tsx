export { TodayPage as Component } from '../features/today/TodayPage';
