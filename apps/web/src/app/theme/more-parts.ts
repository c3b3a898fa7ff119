import {
  checkboxSlotRecipe,
  checkmarkRecipe,
  dialogSlotRecipe,
  listSlotRecipe,
  menuSlotRecipe,
  progressSlotRecipe,
  switchSlotRecipe,
  tableSlotRecipe,
  toastSlotRecipe,
} from '@chakra-ui/react/theme';

/** What only pages behind the sign-in use; comes with them. */
export const moreRecipes = { checkmark: checkmarkRecipe };
export const moreSlotRecipes = {
  checkbox: checkboxSlotRecipe,
  dialog: dialogSlotRecipe,
  list: listSlotRecipe,
  menu: menuSlotRecipe,
  progress: progressSlotRecipe,
  switch: switchSlotRecipe,
  table: tableSlotRecipe,
  toast: toastSlotRecipe,
};
