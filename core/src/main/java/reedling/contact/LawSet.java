// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import reedling.material.MaterialPair;
import reedling.material.MaterialTable;

/**
 * The contact laws of a case, bound to every contact kind and material pair; immutable. Column 0 of a row's history is
 * the engine's (contact radius of the step before); each law's own columns follow.
 */
public final class LawSet {

    /**
     * Kernels of one contact kind and material pair.
     *
     * @param normal all normal stages, in order
     * @param tangential null where the case has no friction law
     * @param rolling null where the case has no rolling law
     * @param twisting null where the case has no twisting law
     */
    public record Bound(
            ContactKernel normal,
            @Nullable ContactKernel tangential,
            @Nullable ContactKernel rolling,
            @Nullable ContactKernel twisting) {}

    /** Normal stages that a case may add to the obligatory one, in order. */
    private static final List<Stage> ADDED = List.of(Stage.ADHESION, Stage.NEAR_FIELD);

    private final Map<Stage, ContactLaw> laws;
    private final Map<ContactKind, List<Bound>> bound = new EnumMap<>(ContactKind.class);
    private final boolean[] signedColumns;
    private final double largestDampingRatio;

    /** Binds laws (one a stage, the normal stage obligatory) to all pairs of a table. */
    public LawSet(Map<Stage, ContactLaw> lawByStage, MaterialTable table) {
        laws = new EnumMap<>(lawByStage);
        if (!laws.containsKey(Stage.NORMAL)) {
            throw new IllegalArgumentException("a normal law is needed");
        }
        List<Boolean> signed = new ArrayList<>(List.of(false));
        Map<Stage, Integer> start = new EnumMap<>(Stage.class);
        laws.forEach((stage, law) -> {
            start.put(stage, signed.size());
            for (HistoryColumn column : law.history()) {
                for (int k = 0; k < column.components(); k++) {
                    signed.add(column.components() == 3);
                }
            }
        });
        signedColumns = new boolean[signed.size()];
        for (int c = 0; c < signedColumns.length; c++) {
            signedColumns[c] = signed.get(c);
        }
        double damping = 0;
        for (ContactKind kind : ContactKind.values()) {
            List<Bound> list = new ArrayList<>();
            for (MaterialPair pair : table.pairs()) {
                Bound one = bind(pair, kind, start);
                damping = Math.max(damping, one.normal().dampingRatio());
                list.add(one);
            }
            bound.put(kind, List.copyOf(list));
        }
        largestDampingRatio = damping;
    }

    private Bound bind(MaterialPair pair, ContactKind kind, Map<Stage, Integer> start) {
        return new Bound(
                normal(pair, kind, start),
                optional(Stage.TANGENTIAL, pair, kind, start),
                optional(Stage.ROLLING, pair, kind, start),
                optional(Stage.TWISTING, pair, kind, start));
    }

    private ContactKernel normal(MaterialPair pair, ContactKind kind, Map<Stage, Integer> start) {
        ContactKernel first = Objects.requireNonNull(optional(Stage.NORMAL, pair, kind, start));
        List<ContactKernel> added = new ArrayList<>();
        for (Stage stage : ADDED) {
            ContactKernel kernel = optional(stage, pair, kind, start);
            if (kernel != null) {
                added.add(kernel);
            }
        }
        return added.isEmpty() ? first : ContactKernel.inOrder(first, added.toArray(new ContactKernel[0]));
    }

    private @Nullable ContactKernel optional(
            Stage stage, MaterialPair pair, ContactKind kind, Map<Stage, Integer> start) {
        ContactLaw law = laws.get(stage);
        return law == null ? null : law.bind(pair, kind, startOf(stage, start));
    }

    private static int startOf(Stage stage, Map<Stage, Integer> start) {
        return Objects.requireNonNull(start.get(stage));
    }

    /** What the laws have to say against contacts of a material pair at an effective radius, m. */
    public List<String> cautions(MaterialPair pair, double radius) {
        return laws.values().stream()
                .flatMap(law -> law.cautions(pair, radius).stream())
                .toList();
    }

    /** Kernels for a contact kind and the number of a material pair. */
    public Bound bound(ContactKind kind, int materialPair) {
        return Objects.requireNonNull(bound.get(kind)).get(materialPair);
    }

    /** Largest of {@link #reaches}, m. */
    public double reach(ContactKind kind, double largestRadius) {
        return Arrays.stream(reaches(kind, largestRadius)).max().orElse(0);
    }

    /**
     * Largest gap at which rows are given to the laws with TOUCH = 1, m, for each material pair; 0 for laws that act only
     * on bodies that overlap.
     *
     * @param largestRadius largest effective radius of rows of this kind, m
     */
    public double[] reaches(ContactKind kind, double largestRadius) {
        return Objects.requireNonNull(bound.get(kind)).stream()
                .mapToDouble(one -> one.normal().reach(largestRadius))
                .toArray();
    }

    /** For each history column of a row, whether it turns its sign when first and second are exchanged. */
    public boolean[] signedColumns() {
        return signedColumns.clone();
    }

    /** Doubles of history a row. */
    public int historyColumns() {
        return signedColumns.length;
    }

    /** Largest damping ratio of all normal kernels. */
    public double largestDampingRatio() {
        return largestDampingRatio;
    }

    /** Name of the law of a stage for messages: that of its plugin, else its class. */
    public String name(Stage stage) {
        ContactLaw law = Objects.requireNonNull(laws.get(stage));
        return law instanceof NamedLaw named ? named.name() : law.getClass().getName();
    }
}
