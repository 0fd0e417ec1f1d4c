export { NewRequirementPage as Component } from '../features/requirements/NewRequirementPage';
