export { NotFound as Component } from '../components/RouteError.tsx'
