export { NothingHere as NotFoundPage } from "./route-failure.tsx";
