export { CurvePage as Component } from '../features/curves/CurvePage';
