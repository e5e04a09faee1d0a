export { ChanceList } from "./chance-list";
export { ChanceSources } from "./chance-sources";
export { ConfirmationList } from "./confirmation-list";
export { HowWorkedOut } from "./how-worked-out";
export { OwnSwitch } from "./own-switch";
