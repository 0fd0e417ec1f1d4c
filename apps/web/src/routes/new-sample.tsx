export { NewSamplePage as Component } from '../features/samples/NewSamplePage';
