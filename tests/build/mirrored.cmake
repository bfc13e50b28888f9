# Every source of a layer has a test of its name: core/parse.cpp, tests/core/parse_test.cpp.
file(GLOB sources RELATIVE ${ROOT} ${ROOT}/core/*.cpp ${ROOT}/estimation/*.cpp ${ROOT}/stats/*.cpp
     ${ROOT}/cli/*.cpp)
list(REMOVE_ITEM sources cli/main.cpp)

set(offences "")
foreach(source IN LISTS sources)
  string(REGEX REPLACE "\\.cpp$" "_test.cpp" test tests/${source})
  if(NOT EXISTS ${ROOT}/${test})
    list(APPEND offences "${source} lacks ${test}")
  endif()
endforeach()
if(offences)
  list(JOIN offences "\n" offences)
  message(FATAL_ERROR "sources without a test:\n${offences}")
endif()
