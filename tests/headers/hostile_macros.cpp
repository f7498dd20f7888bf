// Macros that system and vendor headers are known to define (windows.h, termios.h, complex.h and
// embedded toolchains). Some expand to nothing there; here to a number, so that each use of the
// name in our headers fails to compile.
#include <foreign_headers.hpp>

#define min(a, b) (((a) < (b)) ? (a) : (b))
#define max(a, b) (((a) > (b)) ? (a) : (b))
#define PI 3.14159265358979
#define N 1024
#define F 96485.0
#define B1 0000010
#define I (__extension__ 1.0iF)
#define pascal 1
#define near 16
#define far 32
#define small char

#include <all_forward.hpp>

int among_macros();
int among_macros() { return CONVELOPE_VERSION; }
