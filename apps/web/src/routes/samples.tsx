export { SamplesPage as Component } from '../features/samples/SamplesPage';
