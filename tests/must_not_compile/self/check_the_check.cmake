# CASE is wrong in the way its line `// complaint:` says; check.cmake must complain of just that.
cmake_minimum_required(VERSION 3.22)
file(STRINGS ${CASE} complaint REGEX "^// complaint:")
string(REGEX REPLACE "^// complaint: *" "" complaint "${complaint}")
execute_process(COMMAND ${CMAKE_COMMAND} -DCASE=${CASE} -DCOMPILER=${COMPILER} -DOWN_INCLUDE=${OWN_INCLUDE}
                        "-DINCLUDES=${INCLUDES}" -P ${CMAKE_CURRENT_LIST_DIR}/../check.cmake
                RESULT_VARIABLE result OUTPUT_VARIABLE output ERROR_VARIABLE output)
string(REGEX REPLACE "[ \n]+" " " output "${output}")
string(FIND "${output}" "${complaint}" where)
if(complaint STREQUAL "" OR result EQUAL 0 OR where EQUAL -1)
  message(FATAL_ERROR "expected the complaint '${complaint}', got exit code ${result} and:\n${output}")
endif()
