export { SamplePage as Component } from '../features/samples/SamplePage';
