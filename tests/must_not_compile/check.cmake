# A case is a file with a mistake that must not compile and, under -DTWIN, the same without the
# mistake, which must. Its line `// names: a, b` lists at least two words or phrases, normally the
# two kinds that were mixed up, that the compiler's message must contain in at most 20 lines.
# Where the compiler merely echoes lines of the case file, the words do not count.
# Arguments: CASE, COMPILER, OWN_INCLUDE, INCLUDES (which may hold OWN_INCLUDE again).
cmake_minimum_required(VERSION 3.22)
set(longest 20)

file(STRINGS ${CASE} names REGEX "^// names:")
string(REGEX REPLACE "^// names: *" "" names "${names}")
string(REGEX REPLACE " *, *" ";" names "${names}")
list(LENGTH names count)
if(count LESS 2)
  message(FATAL_ERROR "no line '// names: a, b' with at least two phrases in ${CASE}")
endif()

set(flags -std=c++20 -I${OWN_INCLUDE})
list(REMOVE_ITEM INCLUDES ${OWN_INCLUDE} /usr/include)
foreach(directory IN LISTS INCLUDES)
  list(APPEND flags -isystem${directory})
endforeach()

function(compile result output)
  execute_process(COMMAND ${CMAKE_COMMAND} -E env LC_ALL=C ${COMPILER} ${flags} -fsyntax-only
                          ${ARGN} ${CASE}
                  RESULT_VARIABLE code OUTPUT_VARIABLE text ERROR_VARIABLE text)
  set(${result} ${code} PARENT_SCOPE)
  string(REGEX REPLACE "\n$" "" text "${text}")
  set(${output} "${text}" PARENT_SCOPE)
endfunction()

function(complain about)
  string(REPLACE "\n" "\n  " shown "  ${message_text}") # indented text is not wrapped
  message(FATAL_ERROR "${about}:\n${shown}")
endfunction()

compile(result message_text -DTWIN)
if(NOT result EQUAL 0)
  complain("the twin without the mistake does not compile")
endif()
compile(result message_text)
if(result EQUAL 0)
  message(FATAL_ERROR "the mistake compiles")
endif()

# Lists of CMake split at semicolons and mind brackets, so the text is walked as a string.
file(READ ${CASE} case_text)
set(rest "${message_text}")
set(lines 0)
set(said "")
while(NOT rest STREQUAL "")
  string(FIND "${rest}" "\n" end)
  if(end EQUAL -1)
    set(line "${rest}")
    set(rest "")
  else()
    string(SUBSTRING "${rest}" 0 ${end} line)
    math(EXPR next "${end} + 1")
    string(SUBSTRING "${rest}" ${next} -1 rest)
  endif()
  math(EXPR lines "${lines} + 1")
  string(REPLACE "${CASE}" "" line "${line}")
  string(REGEX REPLACE "^ *[0-9]* \\| " "" line "${line}")
  string(STRIP "${line}" line)
  string(FIND "${case_text}" "${line}" echoed)
  if(echoed EQUAL -1)
    string(APPEND said "${line}\n")
  endif()
endwhile()

if(lines GREATER longest)
  complain("the message has ${lines} lines, more than ${longest}")
endif()
foreach(name IN LISTS names)
  string(REGEX REPLACE "([][+.*()^$?|\\{}])" "\\\\\\1" pattern "${name}")
  if(NOT said MATCHES "(^|[^A-Za-z0-9_])${pattern}($|[^A-Za-z0-9_])")
    complain("the message does not say '${name}'")
  endif()
endforeach()
message(STATUS "${lines} lines:\n${message_text}")
