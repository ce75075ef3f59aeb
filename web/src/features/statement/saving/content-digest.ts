export { digestOf } from "@restband/solver";
