import {
  checkboxSlotRecipe,
  checkmarkRecipe,
  dialogSlotRecipe,
  fieldSlotRecipe,
  fieldsetSlotRecipe,
  inputRecipe,
  menuSlotRecipe,
  nativeSelectSlotRecipe,
  progressSlotRecipe,
  radioGroupSlotRecipe,
  radiomarkRecipe,
  skeletonRecipe,
  skipNavLinkRecipe,
  spinnerRecipe,
  tabsSlotRecipe,
  textareaRecipe,
  toastSlotRecipe,
  tooltipSlotRecipe,
} from '@chakra-ui/react/theme';

/**
 * The recipes of the Chakra parts this product uses. Only these are shipped: the public page pays for each.
 * A part whose recipe is missing here renders without style.
 */
export const recipes = {
  checkmark: checkmarkRecipe,
  input: inputRecipe,
  radiomark: radiomarkRecipe,
  skeleton: skeletonRecipe,
  skipNavLink: skipNavLinkRecipe,
  spinner: spinnerRecipe,
  textarea: textareaRecipe,
};

/** The same for parts made of several slots. */
export const slotRecipes = {
  checkbox: checkboxSlotRecipe,
  dialog: dialogSlotRecipe,
  field: fieldSlotRecipe,
  fieldset: fieldsetSlotRecipe,
  menu: menuSlotRecipe,
  nativeSelect: nativeSelectSlotRecipe,
  progress: progressSlotRecipe,
  radioGroup: radioGroupSlotRecipe,
  tabs: tabsSlotRecipe,
  toast: toastSlotRecipe,
  tooltip: tooltipSlotRecipe,
};
