// Links translation units that include all headers in different orders.
int in_forward_order();
int in_reversed_order();
int among_macros();

int main() {
  return in_forward_order() == in_reversed_order() && in_forward_order() == among_macros() ? 0 : 1;
}
