package weighhouse.quantity;

import java.util.List;

/**
 * A quantity with its evidence.
 *
 * @param quantity what the cell means
 * @param basis the strongest kind of evidence that decided
 * @param evidence one short sentence for each piece of evidence, naming cells in A1 notation
 * @param contradictions sentences on evidence that says otherwise, empty where all agree
 */
public record Inferred(
    Quantity quantity, Basis basis, List<String> evidence, List<String> contradictions) {}
