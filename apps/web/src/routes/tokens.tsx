export { TokensPage as Component } from '../features/tokens/TokensPage';
