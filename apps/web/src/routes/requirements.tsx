export { RequirementsPage as Component } from '../features/requirements/RequirementsPage';
