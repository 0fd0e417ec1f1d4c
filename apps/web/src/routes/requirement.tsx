export { RequirementPage as Component } from '../features/requirements/RequirementPage';
