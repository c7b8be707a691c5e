export { builtInMaterials as materials } from "@/bending/handbook/materials";
