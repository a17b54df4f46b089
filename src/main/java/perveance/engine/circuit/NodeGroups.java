package perveance.engine.circuit;

/** Disjoint sets of nodes that have been joined. */
final class NodeGroups {
  private final int[] parent;

  NodeGroups(int nodes) {
    parent = new int[nodes];
    for (int i = 0; i < nodes; i++) {
      parent[i] = i;
    }
  }

  /** Representative of a node's group. */
  int of(int node) {
    int at = node;
    while (parent[at] != at) {
      parent[at] = parent[parent[at]];
      at = parent[at];
    }
    return at;
  }

  /** Joins two groups; false when they were one already. */
  boolean join(int a, int b) {
    int ra = of(a);
    int rb = of(b);
    parent[ra] = rb;
    return ra != rb;
  }
}
