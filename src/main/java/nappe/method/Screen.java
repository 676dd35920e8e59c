package nappe.method;

import java.util.List;

/**
 * A comparison of all the words of a choice: of all standard sizes.
 *
 * @param choice the symbol of the choice
 * @param targets what is compared, in the order of the statement
 * @param members what rests on the choice and leads to the targets, in order; no root among them
 */
public record Screen(String choice, List<String> targets, List<Item> members) {}
