// names: wall
// complaint: with at least two phrases
struct wall {};
void f() { wall w = 1; }
